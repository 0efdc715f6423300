import { setFlagsFromString } from 'node:v8';

/**
 * Lets a function run four times as long before it is compiled for speed. A short diagnosis is over before that pays:
 * compiled at the usual moment the fit is compiled two to four times anew, as it meets what it had not seen. A hard case
 * of N = 12 takes 17 % less time, of N = 64 20 %, long ones the same. Answers do not depend on it.
 */
export function compileLater(): void {
  // V8's own count, 67584 when not set (Node 20).
  setFlagsFromString('--interrupt-budget=270000');
}
