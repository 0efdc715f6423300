import { legendSample, SAMPLE } from '$lib/charts/legend-sample';
import type { LegendEntry, Picture } from '$lib/charts/picture';
import type { Flow } from '../page/flow';
import { PAGE } from '../page/geometry';
import { tagged, type Element } from '../page/tags';
import { breakLines } from '../type/break-lines';
import type { Pen } from '../type/pen';
import { STYLES } from '../type/styles';
import type { Block } from './blocks';
import { drawMarks } from './draw-marks';
import { setHeading } from './set-heading';
import { setParagraph } from './set-paragraph';

type Figure = Block & { kind: 'figure' };

/** Points for a unit of a chart: its letters of 13 units come to 8 points. */
const SCALE = 0.62;
const SAMPLE_SCALE = 0.66;
const LEGEND_ROW = 12.5;
const TITLE_GAP = 5;

/** Widths and scales to try, the roomiest first; the others only where a chart has to share a page. */
const SIZES = [
  { width: PAGE.main / SCALE, scale: SCALE },
  { width: 470, scale: SCALE },
  { width: 400, scale: SCALE },
  { width: 400, scale: 0.56 },
  { width: 400, scale: 0.5 }
];

interface Fitted {
  picture: Picture;
  scale: number;
  height: number;
}

function fitted({ title, draw, fit }: Figure, pen: Pen, room: number): Fitted {
  const titleLines = breakLines([{ text: title, style: STYLES.heading }], PAGE.main, pen).length;
  const sized = ({ width, scale }: (typeof SIZES)[number]): Fitted => {
    const picture = draw({ width, text: 13 });
    const rows = legendRows(picture.legend, pen).length;
    const height =
      titleLines * STYLES.heading.leading + TITLE_GAP + picture.height * scale + 4 + rows * LEGEND_ROW + 2;
    return { picture, scale, height };
  };
  const first = sized(SIZES[0]);
  if (!fit || first.height <= room) return first;
  for (const size of SIZES.slice(1)) {
    const smaller = sized(size);
    if (smaller.height <= room) return smaller;
  }
  return first;
}

/** Height of a figure without its notes, as it would be set in the room that is left. */
export const figureHeight = (flow: Flow, figure: Figure): number =>
  fitted(figure, flow.pen, flow.room).height;

/** A chart: its finding as the heading, the drawing, its legend, and what it gathers together in words. */
export function setFigure(flow: Flow, figure: Figure, parent: Element): void {
  const { picture, scale } = fitted(figure, flow.pen, flow.room);
  setHeading(flow, { kind: 'heading', text: figure.title }, parent);
  flow.y += TITLE_GAP;
  const top = flow.y;
  const rows = legendRows(picture.legend, flow.pen);
  const bottom = top + picture.height * scale + 4 + rows.length * LEGEND_ROW;
  const labels = picture.legend.map(({ label }) => label).join('; ');
  const draw = (): void => {
    drawMarks(flow.pen, picture.marks, PAGE.left, top, scale);
    rows.forEach((row, i) => drawLegend(flow.pen, row, top + picture.height * scale + 4 + i * LEGEND_ROW));
  };
  tagged(flow, parent, 'Figure', draw, {
    alt: `${figure.what}. ${figure.title}. Marks: ${labels}.`,
    bbox: [PAGE.left, top, PAGE.left + PAGE.main, bottom]
  });
  flow.y = bottom + 2;
  for (const note of picture.notes)
    setParagraph(flow, { kind: 'paragraph', text: note, look: 'smallFaint' }, parent);
}

interface Placed extends LegendEntry {
  x: number;
}

/** Legend entries one after the other, on as many lines as they need. */
function legendRows(entries: LegendEntry[], pen: Pen): Placed[][] {
  const rows: Placed[][] = [[]];
  let x = 0;
  for (const entry of entries) {
    const needed = SAMPLE.width * SAMPLE_SCALE + 5 + pen.width(entry.label, STYLES.small);
    if (x > 0 && x + needed > PAGE.main) {
      rows.push([]);
      x = 0;
    }
    rows[rows.length - 1].push({ ...entry, x });
    x += needed + 13;
  }
  return rows;
}

function drawLegend(pen: Pen, row: Placed[], y: number): void {
  for (const { role, label, x } of row) {
    drawMarks(pen, legendSample(role), PAGE.left + x, y, SAMPLE_SCALE);
    pen.place(label, PAGE.left + x + SAMPLE.width * SAMPLE_SCALE + 5, y + 8, STYLES.small);
  }
}
