const moment = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  hour: '2-digit',
  minute: '2-digit',
  timeZone: 'UTC'
});

/** Day and time in UTC, from milliseconds since 1970: the same in every browser, so that it can be quoted. */
export const sayMoment = (at: number): string => `${moment.format(at)} UTC`;
