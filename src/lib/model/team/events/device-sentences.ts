import { byScript, type Words } from './saying';

/** What happens to devices, their versions and gates. */
export const DEVICE_SENTENCES: Record<string, Words> = {
  'device.order': {
    label: 'order of versions',
    say: ({ who, detail }) =>
      `${who} moved version “${detail.version}” of ${detail.name} to place ${detail.place}${byScript(detail)}`
  },
  'device.notes': {
    label: 'notes on a device',
    say: ({ who, detail }) =>
      `${who} changed the notes on ${detail.version ? `version “${detail.version}” of ` : ''}${detail.name}${byScript(detail)}`
  },
  'device.remove-version': {
    label: 'version removed',
    say: ({ who, detail }) =>
      `${who} removed version “${detail.version}” of ${detail.name}${byScript(detail)}`
  },
  'gate.rule': {
    label: 'rule of a gate',
    say: ({ who, detail }) =>
      `${who} set the rule of the gate of ${detail.name}, with version “${detail.reference}” as reference${byScript(detail)}`
  },
  'gate.pass': {
    label: 'gate passed',
    say: ({ detail }) => `Version “${detail.version}” of ${detail.device} passed its gate`
  },
  'gate.fail': {
    label: 'gate failed',
    say: ({ detail }) => `Version “${detail.version}” of ${detail.device} failed its gate`
  },
  'gate.undecided': {
    label: 'gate undecided',
    say: ({ detail }) => `The gate of version “${detail.version}” of ${detail.device} is undecided`
  }
};
