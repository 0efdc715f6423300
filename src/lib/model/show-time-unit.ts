/** A unit of time as it is shown: "us", which is typed for want of a µ, as "µs"; any other as it stands. */
export const showTimeUnit = (unit: string): string => (unit === 'us' ? 'µs' : unit);
