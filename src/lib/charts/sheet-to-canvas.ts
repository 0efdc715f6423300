import { inkOfRole } from './ink-of-role';
import { DOWNLOAD_INKS, FACES } from './inks';
import type { Mark, TextMark } from './picture';
import type { Sheet } from './sheet-of';

/** Draws the sheet on a canvas that already has its scale, on white, in the day inks. */
export function sheetToCanvas({ width, height, around, picture, left, top }: Sheet, context: Canvas): void {
  context.fillStyle = DOWNLOAD_INKS.paper;
  context.fillRect(0, 0, width, height);
  for (const mark of around) drawMark(mark, context);
  context.translate(left, top);
  for (const mark of picture.marks) drawMark(mark, context);
  context.translate(-left, -top);
}

type Canvas = CanvasRenderingContext2D;

function drawMark(mark: Mark, context: Canvas): void {
  if (mark.kind === 'text') return drawText(mark, context);
  const look = inkOfRole(mark.role);
  const path = new Path2D(mark.d);
  if (look.fill !== 'none') {
    context.fillStyle = DOWNLOAD_INKS[look.fill];
    context.fill(path);
  }
  if (look.stroke !== 'none') {
    context.strokeStyle = DOWNLOAD_INKS[look.stroke];
    context.lineWidth = look.width;
    context.setLineDash(look.dash);
    context.stroke(path);
  }
}

/** Canvas has no raised digits: they are set apart, and the whole is placed by its full width. */
function drawText(mark: TextMark, context: Canvas): void {
  const { family, weight } = FACES[mark.face];
  const large = `${weight} ${mark.size}px ${family}`;
  const small = `${weight} ${mark.size * 0.75}px ${family}`;
  context.fillStyle = DOWNLOAD_INKS[mark.ink];
  context.font = large;
  const main = context.measureText(mark.text).width;
  context.font = small;
  const full = main + (mark.raised === undefined ? 0 : context.measureText(mark.raised).width);
  const left = mark.x - (mark.anchor === 'end' ? full : mark.anchor === 'middle' ? full / 2 : 0);
  if (mark.raised !== undefined) context.fillText(mark.raised, left + main, mark.y - mark.size * 0.4);
  context.font = large;
  if (mark.halo) {
    context.strokeStyle = DOWNLOAD_INKS.paper;
    context.lineWidth = 4;
    context.setLineDash([]);
    context.strokeText(mark.text, left, mark.y);
  }
  context.fillText(mark.text, left, mark.y);
}
