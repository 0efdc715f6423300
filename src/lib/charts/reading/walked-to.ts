import type { Picture } from '../picture';
import { stepOfKey } from './step-of-key';

/** What of a key press matters here; a KeyboardEvent has it. */
type Press = Pick<KeyboardEvent, 'key' | 'ctrlKey' | 'metaKey' | 'altKey'>;

/**
 * The reading that a key leads to from reading `chosen` (−1: none is chosen); −1 where Escape ends the reading, null for
 * a press that means nothing to a chart.
 */
export function walkedTo(
  press: Press,
  picture: Pick<Picture, 'readings' | 'order'>,
  chosen: number
): number | null {
  if (press.ctrlKey || press.metaKey || press.altKey) return null;
  if (press.key === 'Escape') return chosen >= 0 ? -1 : null;
  const step = stepOfKey(press.key, picture);
  if (step === null) return null;
  const last = picture.readings.length - 1;
  const from = chosen < 0 ? (step > 0 ? -1 : last + 1) : chosen;
  return Math.max(0, Math.min(last, from + step));
}
