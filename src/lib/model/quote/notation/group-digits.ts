/** Digits with `between` after each third digit before the point: "12350.20" becomes "12 350.20". */
export function groupDigits(digits: string, between: string): string {
  const [whole, part] = digits.split('.');
  const spaced = whole.replace(/\B(?=(\d{3})+$)/g, () => between);
  return part === undefined ? spaced : `${spaced}.${part}`;
}
