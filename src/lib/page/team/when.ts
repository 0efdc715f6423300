const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeZone: 'UTC' });
const moment = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short', timeZone: 'UTC' });

/** "14 Mar 2026", the day in UTC: server and browser write the same. */
export const sayDay = (at: number): string => day.format(at);

/** "14 Mar 2026, 09:12 UTC". */
export const sayMoment = (at: number): string => `${moment.format(at)} UTC`;

export const isoOf = (at: number): string => new Date(at).toISOString();
