/** A name as part of a file's: letters and digits of any script, joined by hyphens; `without` where it has none. */
export function plainName(name: string, without: string): string {
  const words = name.toLowerCase().match(/[\p{L}\p{N}]+/gu) ?? [];
  return words.join('-').slice(0, 60) || without;
}
