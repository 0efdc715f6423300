import type { MixedCondition } from './types';

const NAMES: Record<MixedCondition['of'], [string, string]> = {
  device: ['device', 'devices'],
  firmware: ['firmware version', 'firmware versions'],
  group: ['group', 'groups']
};

/** What it means that the datasets of a sweep are not of one device, firmware version and group; nothing where they are. */
export function mixedCaution(mixed: MixedCondition[] = []): string[] {
  if (mixed.length === 0) return [];
  const parts = mixed.map(({ of, stated, unstated }) => {
    const none = unstated === 0 ? '' : ` (${unstated} ${unstated === 1 ? 'states' : 'state'} none)`;
    return `${stated} ${NAMES[of][stated === 1 ? 0 : 1]}${none}`;
  });
  const last = parts.pop();
  return [
    `The datasets are of ${parts.length > 0 ? `${parts.join(', ')} and ` : ''}${last}: what changes along the time may be a difference between these, and not the time’s doing.`
  ];
}
