/** Text without the signs that embed or override a direction of writing: what follows it would be turned as well. */
export const unturned = (text: string): string => text.replace(/[\u202a-\u202e\u2066-\u2069]/g, '');
