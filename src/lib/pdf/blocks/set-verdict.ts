import type { Ink, Mark } from '$lib/charts/picture';
import { pointPath } from '$lib/charts/point-path';
import { VERDICTS } from '$lib/model/labels';
import type { Diagnosis, Verdict } from '$lib/stats/types';
import type { Flow } from '../page/flow';
import { PAGE } from '../page/geometry';
import { adorn, tag, tagged, type Element } from '../page/tags';
import { cleanText } from '../type/clean-text';
import { STYLES } from '../type/styles';
import { drawMarks } from './draw-marks';
import { baseline, setLines } from './set-lines';

const INKS: Record<Verdict, Ink> = { compatible: 'ink', 'ruled-out': 'oxide', undecided: 'brass' };

/** The verdict in the charts' own grammar: a point on its law, far above it, or with an interval too long. */
const SIGNS: Record<Verdict, Mark[]> = {
  compatible: [
    { kind: 'path', role: 'fitted', d: 'M2,22H62' },
    { kind: 'path', role: 'interval', d: 'M32,13V31' },
    { kind: 'path', role: 'observed', d: pointPath([[32, 22]], 'dot', 10) }
  ],
  'ruled-out': [
    { kind: 'path', role: 'fitted', d: 'M2,32H62' },
    { kind: 'path', role: 'interval-more', d: 'M32,3V27' },
    { kind: 'path', role: 'observed-more', d: pointPath([[32, 14]], 'up', 12) }
  ],
  undecided: [
    { kind: 'path', role: 'fitted', d: 'M2,26H62' },
    { kind: 'path', role: 'interval-unsure', d: 'M32,2V40' },
    { kind: 'path', role: 'observed-unsure', d: pointPath([[32, 17]], 'diamond', 12) }
  ]
};

const SCALE = 0.62;

/** The answer: its mark and name, and the statement as the title of the report. */
export function setVerdict(flow: Flow, { answer }: Pick<Diagnosis, 'answer'>, parent: Element): void {
  const { verdict } = answer;
  const style = { ...STYLES.verdict, ink: INKS[verdict] };
  adorn(flow.doc, () => drawMarks(flow.pen, SIGNS[verdict], PAGE.left, flow.y, SCALE));
  tagged(flow, parent, 'P', () => {
    flow.pen.place(VERDICTS[verdict], PAGE.left + 64 * SCALE + 8, flow.y + 6 + baseline(style), style);
  });
  flow.y += 29;
  const spans = [{ text: cleanText(answer.statement), style: STYLES.answer }];
  setLines(flow, tag(flow.doc, parent, 'H1'), 'H1', spans, PAGE.left, PAGE.main);
  flow.y += 7;
}
