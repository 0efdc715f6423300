import { counts } from './counts';
import type { Format } from './format';
import { json } from './json';
import { positions } from './positions';
import { shots } from './shots';

/** Every format, in the order in which a text is offered to them. A new format is one line here. */
export const formats: Format[] = [json, counts, shots, positions];
