const DAY = 86_400_000;
const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeZone: 'UTC' });
const moment = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short', timeZone: 'UTC' });

/**
 * How long something stays open, as a person would say it: the last day and not the midnight after it.
 *
 * @param at first millisecond since 1970 (UTC) at which it is closed
 * @returns "until 1 Jan 2027, end of day UTC", or "until 1 Jan 2027, 14:30 UTC" where it does not end with a day
 */
export const sayUntil = (at: number): string =>
  at % DAY === 0 ? `until ${day.format(at - 1)}, end of day UTC` : `until ${moment.format(at)} UTC`;
