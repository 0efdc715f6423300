const HOUR = 3_600_000;

/**
 * Whether the last of several moments, oldest first, is one to mail about when there is one mail an hour: the first is,
 * and each that comes an hour or more after the last that was. Told from the remarks themselves, so a restart forgets
 * nothing.
 */
export function isDue(moments: number[]): boolean {
  let mailed = -Infinity;
  let due = false;
  for (const at of moments) {
    due = at - mailed >= HOUR;
    if (due) mailed = at;
  }
  return due;
}
