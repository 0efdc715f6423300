import { legendSample, SAMPLE } from '$lib/charts/legend-sample';
import type { LegendEntry } from '$lib/charts/picture';
import { breakLines, type Line } from '../type/break-lines';
import type { Pen } from '../type/pen';
import { STYLES } from '../type/styles';
import { drawMarks } from './draw-marks';
import { placeLine } from './set-lines';

const SCALE = 0.66;
/** From the left edge of a sample to its label. */
const LABEL = SAMPLE.width * SCALE + 5;
const GAP = 13;
const ROW = 12.5;

interface Placed {
  entry: LegendEntry;
  x: number;
  y: number;
  lines: Line[];
}

export interface Legend {
  placed: Placed[];
  height: number;
}

/** Legend entries one after the other, on as many lines as `width` asks for. */
export function legendBelow(entries: LegendEntry[], width: number, pen: Pen): Legend {
  const placed: Placed[] = [];
  let x = 0;
  let y = 0;
  for (const entry of entries) {
    const lines = breakLines([{ text: entry.label, style: STYLES.small }], width - LABEL, pen);
    const needed = LABEL + Math.max(...lines.map((line) => line.width));
    if (x > 0 && x + needed > width) {
      x = 0;
      y += ROW;
    }
    placed.push({ entry, x, y, lines });
    x += needed + GAP;
  }
  return { placed, height: entries.length === 0 ? 0 : y + ROW };
}

/** Legend entries under one another, for a narrow column beside a chart. */
export function legendBeside(entries: LegendEntry[], width: number, pen: Pen): Legend {
  let y = 0;
  const placed = entries.map((entry) => {
    const lines = breakLines([{ text: entry.label, style: STYLES.small }], width - LABEL, pen);
    const at = { entry, x: 0, y, lines };
    y += Math.max(ROW, lines.length * STYLES.small.leading) + 3;
    return at;
  });
  return { placed, height: y };
}

/** Draws a legend with its corner at `left`, `top`. */
export function drawLegend(legend: Legend, left: number, top: number, pen: Pen): void {
  for (const { entry, x, y, lines } of legend.placed) {
    drawMarks(pen, legendSample(entry), left + x, top + y, SCALE);
    lines.forEach((line, i) =>
      placeLine(line, left + x + LABEL, top + y - 0.3 + i * STYLES.small.leading, line.width, pen)
    );
  }
}
