/** Names are typed freely: none may begin a line of its own in a text file, or turn the direction of writing. */
export const onOneLine = (text: string): string => text.replace(/[\p{Cc}\p{Cf}\s]+/gu, ' ').trim();
