/**
 * Labels for evenly spaced ticks, all with the same number of decimals, with a real minus sign and
 * thin spaces in thousands.
 * @param factor 100 for percent, with `unit` ' %'
 */
export function tickTexts(values: number[], factor = 1, unit = ''): string[] {
  const step =
    values.length > 1 ? Math.abs(values[1] - values[0]) * factor : Math.abs(values[0] ?? 1) * factor || 1;
  const decimals = Math.min(12, Math.max(0, Math.ceil(-Math.log10(step) - 1e-9)));
  return values.map((value) => {
    const fixed = Math.abs(value * factor).toFixed(decimals);
    const [whole, part] = fixed.split('.');
    const grouped = whole.replace(/\B(?=(\d{3})+$)/g, '\u2009');
    const sign = value < 0 && Number(fixed) !== 0 ? '\u2212' : '';
    return `${sign}${grouped}${part ? `.${part}` : ''}${unit}`;
  });
}
