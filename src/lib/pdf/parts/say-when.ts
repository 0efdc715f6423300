/** A time as "1 December 2026, 16:05 UTC": the same wherever the file is made. */
export function sayWhen(time: Date): string {
  const months = 'January February March April May June July August September October November December';
  const month = months.split(' ')[time.getUTCMonth()];
  const clock = time.toISOString().slice(11, 16);
  return `${time.getUTCDate()} ${month} ${time.getUTCFullYear()}, ${clock} UTC`;
}
