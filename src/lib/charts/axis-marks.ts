import type { Frame, Mark, TextMark, Tick } from './picture';

const label = (tick: Tick, place: Pick<TextMark, 'x' | 'y' | 'anchor'>, size: number): TextMark => ({
  kind: 'text',
  ...place,
  text: tick.text,
  ...(tick.raised === undefined ? {} : { raised: tick.raised }),
  ink: 'ink',
  face: 'number',
  size
});

const caption = (text: string, x: number, y: number, anchor: TextMark['anchor'], size: number): TextMark => ({
  kind: 'text',
  x,
  y,
  text,
  anchor,
  ink: 'faint',
  face: 'text',
  size
});

/** Axis under the frame: line, ticks, their labels, and its title at the right below them. */
export function bottomAxis(frame: Frame, ticks: Tick[], title: string, size: number): Mark[] {
  const ends = `M${frame.left},${frame.bottom}H${frame.right}`;
  const strokes = ticks.map(({ at }) => `M${at.toFixed(2)},${frame.bottom}v5`).join('');
  return [
    { kind: 'path', role: 'axis', d: ends + strokes },
    ...ticks.map((tick) => label(tick, { x: tick.at, y: frame.bottom + 7 + size, anchor: 'middle' }, size)),
    caption(title, frame.right, frame.bottom + 11 + 2.3 * size, 'end', size)
  ];
}

/**
 * Axis at the left of the frame: ticks, labels, hairlines across, and its title level above the frame.
 * @param exponent power of ten that was taken out of the labels (scaled-texts.ts), told in the title
 */
export function leftAxis(frame: Frame, ticks: Tick[], title: string, size: number, exponent = 0): Mark[] {
  const at = { x: 0, y: frame.top - size * 0.9 };
  const named: Mark = exponent
    ? {
        ...caption(`${title}, in 10`, at.x, at.y, 'start', size),
        raised: String(exponent).replace('-', '\u2212')
      }
    : caption(title, at.x, at.y, 'start', size);
  const across = ticks.map(({ at }) => `M${frame.left},${at.toFixed(2)}H${frame.right}`).join('');
  return [
    { kind: 'path', role: 'grid', d: across },
    ...ticks.map((tick) => label(tick, { x: frame.left - 8, y: tick.at + size * 0.35, anchor: 'end' }, size)),
    ...(title ? [named] : [])
  ];
}
