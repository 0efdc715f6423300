import type { Picture } from '$lib/charts/picture';
import type { Flow } from '../page/flow';
import { PAGE } from '../page/geometry';
import { tagged, type Element } from '../page/tags';
import { breakLines } from '../type/break-lines';
import type { Pen } from '../type/pen';
import { STYLES } from '../type/styles';
import type { Block } from './blocks';
import { drawMarks } from './draw-marks';
import { drawLegend, legendBelow, legendBeside, type Legend } from './legend-layout';
import { setHeading } from './set-heading';
import { setParagraph } from './set-paragraph';

type Figure = Block & { kind: 'figure' };

const TITLE_GAP = 5;
const LEGEND_GAP = 5;

/** How large to draw: width in a chart's own units, points for each of them, and where its legend goes. */
interface Sizing {
  width: number;
  scale: number;
  beside: boolean;
}

/** Letters of 13 units come to 8 points. */
const SCALE = 0.62;
const WHOLE: Sizing = { width: PAGE.main / SCALE, scale: SCALE, beside: false };

/** What to try where a chart has to share a page, the roomiest first. */
const SMALLER: Sizing[] = [
  { width: 470, scale: SCALE, beside: false },
  { width: 400, scale: SCALE, beside: true },
  { width: 420, scale: 0.57, beside: true },
  { width: 440, scale: 0.53, beside: true },
  { width: 450, scale: 0.5, beside: true }
];

interface Fitted {
  picture: Picture;
  scale: number;
  legend: Legend;
  /** Where the legend stands, from the corner of the drawing. */
  legendAt: [x: number, y: number];
  /** Drawing and legend together. */
  bodyHeight: number;
  /** With the title. */
  height: number;
}

/** Drawings already made: a figure is measured several times before it is set. */
const made = new WeakMap<Figure, Map<Sizing, Fitted>>();

function sized(figure: Figure, sizing: Sizing, pen: Pen): Fitted {
  const known = made.get(figure) ?? new Map<Sizing, Fitted>();
  made.set(figure, known);
  const fitted = known.get(sizing) ?? drawn(figure, sizing, pen);
  known.set(sizing, fitted);
  return fitted;
}

function drawn({ title, draw }: Figure, { width, scale, beside }: Sizing, pen: Pen): Fitted {
  const picture = draw({ width, text: 13 });
  const [drawnWidth, drawnHeight] = [picture.width * scale, picture.height * scale];
  const column = drawnWidth + 10;
  const legend = beside
    ? legendBeside(picture.legend, PAGE.main - column, pen)
    : legendBelow(picture.legend, PAGE.main, pen);
  const bodyHeight = beside
    ? Math.max(drawnHeight, legend.height + 12)
    : drawnHeight + LEGEND_GAP + legend.height;
  const titleLines = breakLines([{ text: title, style: STYLES.heading }], PAGE.main, pen).length;
  return {
    picture,
    scale,
    legend,
    legendAt: beside ? [column, 12] : [0, drawnHeight + LEGEND_GAP],
    bodyHeight,
    height: titleLines * STYLES.heading.leading + TITLE_GAP + bodyHeight + 2
  };
}

function fitted(figure: Figure, pen: Pen, room: number): Fitted {
  const whole = sized(figure, WHOLE, pen);
  if (whole.height <= room) return whole;
  // Only the figure that must share its page is drawn with smaller letters.
  for (const sizing of figure.fit ? SMALLER : SMALLER.filter(({ scale }) => scale === SCALE)) {
    const smaller = sized(figure, sizing, pen);
    if (smaller.height <= room) return smaller;
  }
  return whole;
}

/** Height of a figure without its notes, as it would be set in `room` points. */
export const figureHeight = (flow: Flow, figure: Figure, room = flow.room): number =>
  fitted(figure, flow.pen, room).height;

/** A chart: its finding as the heading, the drawing, its legend, and what it gathers together in words. */
export function setFigure(flow: Flow, figure: Figure, parent: Element): void {
  const { picture, scale, legend, legendAt, bodyHeight } = fitted(figure, flow.pen, flow.room);
  setHeading(flow, { kind: 'heading', text: figure.title }, parent);
  flow.y += TITLE_GAP;
  const top = flow.y;
  const labels = picture.legend.map(({ label }) => label).join('; ');
  const draw = (): void => {
    drawMarks(flow.pen, picture.marks, PAGE.left, top, scale);
    drawLegend(legend, PAGE.left + legendAt[0], top + legendAt[1], flow.pen);
  };
  tagged(flow, parent, 'Figure', draw, {
    alt: `${figure.what}. ${figure.title}. Marks: ${labels}.`,
    bbox: [PAGE.left, top, PAGE.left + PAGE.main, top + bodyHeight]
  });
  flow.y = top + bodyHeight + 2;
  for (const note of picture.notes)
    setParagraph(flow, { kind: 'paragraph', text: note, look: 'smallFaint' }, parent);
}
