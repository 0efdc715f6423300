import { classifyName } from '../table/classify-name';
import { normaliseName } from '../table/normalise-name';

/** A condition that a column can state. */
export type Stated =
  | 'device'
  | 'firmware'
  | 'group'
  | 'quenchTime'
  | 'holdTime'
  | 'geometry'
  | 'unit'
  | 'trials'
  | 'misread'
  | 'misreadUncertainty'
  | 'kept'
  | 'postSelection'
  | 'measuredOn'
  | 'notes';

/** Words that settle a column, asked in this order: "quench device" is a device, "hold time" no quench time. */
const words: [Stated, RegExp][] = [
  [
    'device',
    /\b(device|devices|chip|processor|machine|gerat|geraet|appareil|dispositif|dispositivo|apparaat)\b/
  ],
  ['firmware', /\b(firmware|version|release)\b/],
  ['group', /\b(group|register|region|gruppe|groupe|grupo|gruppo|groep)\b/],
  ['holdTime', /\b(hold|holding|wait|waiting|delay|haltezeit)\b/],
  ['quenchTime', /\b(quench|ramp|ramping|anneal|annealing|rampe|tau q|tauq)\b|^tau$/],
  ['geometry', /\b(geometry|geometrie|geometria|boundary|topology)\b/],
  [
    'misreadUncertainty',
    /\b(misread|misreads|misreading|readout error|read out error)\b.*\b(uncertainty|sigma|std)\b|\b(uncertainty|sigma|std)\b.*\b(misread|misreads|misreading|readout error|read out error)\b/
  ],
  ['kept', /\b(kept|cut)\b/],
  ['misread', /\b(misread|misreads|misreading|readout error|read out error)\b/],
  ['postSelection', /\b(postselection|post selection|postselected|post selected|selection)\b/],
  ['measuredOn', /\b(date|day|datum|fecha|measured)\b/],
  ['notes', /\b(notes?|comments?|remarks?|bemerkung|bemerkungen|kommentar|notas?)\b/],
  ['unit', /^(unit|counted in|unit of counts?)$/]
];

/**
 * Which condition a column states, by its name; null when none is recognised. Common practice of the field's
 * files; names are reduced by `normaliseName` first.
 */
export function conditionOfName(name: string): Stated | null {
  const normal = normaliseName(name);
  const found = words.find(([, pattern]) => pattern.test(normal));
  if (found) return found[0];
  return classifyName(name) === 'trials' ? 'trials' : null;
}
