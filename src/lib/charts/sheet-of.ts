import { legendSample, SAMPLE } from './legend-sample';
import type { Mark, Picture, TextMark } from './picture';
import { wrapped } from './wrapped';

/** A picture with its title above and its legend and source below: what a saved file shows. */
export interface Sheet {
  width: number;
  height: number;
  /** Title, legend and source, in sheet units. */
  around: Mark[];
  picture: Picture;
  /** Where the picture's own top left corner lies. */
  left: number;
  top: number;
}

const EDGE = 16;
const SIZE = 13;

/**
 * Sets a picture on a sheet of its own.
 * @param source one line that says where the numbers come from
 */
export function sheetOf(picture: Picture, title: string, source: string): Sheet {
  const around: Mark[] = [];
  const put = (
    text: string,
    x: number,
    y: number,
    face: TextMark['face'],
    size: number,
    ink: TextMark['ink']
  ) => around.push({ kind: 'text', x, y, text, anchor: 'start', ink, face, size });

  let y = EDGE + 16;
  for (const line of wrapped(title, (picture.width * 1.85) / 17)) {
    put(line, EDGE, y, 'bold', 17, 'ink');
    y += 22;
  }
  const top = y;
  y += picture.height + 8;
  let x = EDGE;
  for (const entry of picture.legend) {
    const { label } = entry;
    const needed = SAMPLE.width + 8 + label.length * SIZE * 0.55 + 22;
    if (x > EDGE && x + needed > EDGE + picture.width) {
      x = EDGE;
      y += 22;
    }
    around.push(...legendSample(entry, x, y));
    put(label, x + SAMPLE.width + 8, y + 12.5, 'text', SIZE, 'ink');
    x += needed;
  }
  y += 40;
  for (const line of [...picture.notes, source].flatMap((text) =>
    wrapped(text, (picture.width * 1.85) / 12)
  )) {
    put(line, EDGE, y, 'text', 12, 'faint');
    y += 16;
  }
  return { width: picture.width + 2 * EDGE, height: y + 2, around, picture, left: EDGE, top };
}
