/**
 * A column name reduced to lower-case words: no accents, no units in brackets, no marks;
 * "quenchTime", "quench_time" and "Quench time (µs)" all give "quench time".
 */
export function normaliseName(name: string): string {
  return name
    .replace(/\([^)]*\)|\[[^\]]*\]/g, ' ')
    .replace(/([\p{Ll}\d])(\p{Lu})/gu, '$1 $2')
    .toLowerCase()
    .replace(/ß/g, 'ss')
    .normalize('NFKD')
    .replace(/\p{Mn}/gu, '')
    .normalize('NFC')
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();
}
