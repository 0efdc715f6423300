/** A file as it is named in messages; `-` is standard input. */
export const inputName = (file: string): string => (file === '-' ? 'standard input' : file);
