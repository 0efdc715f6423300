/** An address as it is kept and compared: trimmed, lower case. */
export const normalEmail = (email: string): string => email.trim().toLowerCase();
