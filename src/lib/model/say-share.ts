/** A share that somebody chose, as per cent with the digits it was given: 0.1 is "10", 0.125 is "12.5". */
export const percentOf = (share: number): string => String(Number((share * 100).toPrecision(12)));

/** The same with its sign: "10 %". */
export const sayShare = (share: number): string => `${percentOf(share)}\u202f%`;
