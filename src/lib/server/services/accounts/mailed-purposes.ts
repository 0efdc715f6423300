/** What a mailed link is for, and how many minutes it works. */
export const MINUTES = { 'sign-in': 15, password: 30 } as const;

export type Purpose = keyof typeof MINUTES;
