import { inkOfRole } from './ink-of-role';
import { DOWNLOAD_INKS, FACES } from './inks';
import type { Mark, TextMark } from './picture';
import type { Sheet } from './sheet-of';

const escaped = (text: string): string =>
  text.replace(
    /[&<>"]/g,
    (sign) => ({ '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' })[sign] ?? sign
  );

function textElement(mark: TextMark): string {
  const { family, weight } = FACES[mark.face];
  const raised =
    mark.raised === undefined
      ? ''
      : `<tspan dy="${-mark.size * 0.4}" font-size="${mark.size * 0.75}">${escaped(mark.raised)}</tspan>`;
  const halo = mark.halo ? ` paint-order="stroke" stroke="${DOWNLOAD_INKS.paper}" stroke-width="4"` : '';
  return (
    `<text x="${mark.x}" y="${mark.y}" text-anchor="${mark.anchor}" font-size="${mark.size}" ` +
    `font-family="${family}" font-weight="${weight}" fill="${DOWNLOAD_INKS[mark.ink]}"${halo}>` +
    `${escaped(mark.text)}${raised}</text>`
  );
}

function element(mark: Mark): string {
  if (mark.kind === 'text') return textElement(mark);
  const look = inkOfRole(mark.role);
  const dash = look.dash.length ? ` stroke-dasharray="${look.dash.join(' ')}"` : '';
  return (
    `<path d="${mark.d}" fill="${DOWNLOAD_INKS[look.fill]}" stroke="${DOWNLOAD_INKS[look.stroke]}" ` +
    `stroke-width="${look.width}"${dash}/>`
  );
}

/** The sheet as an SVG file that stands alone, on white, in the day inks. */
export function sheetToSvg({ width, height, around, picture, left, top }: Sheet, title: string): string {
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}" viewBox="0 0 ${width} ${height}" role="img">` +
    `<title>${escaped(title)}</title><rect width="${width}" height="${height}" fill="${DOWNLOAD_INKS.paper}"/>` +
    `${around.map(element).join('')}<g transform="translate(${left} ${top})">` +
    `${picture.marks.map(element).join('')}</g></svg>\n`
  );
}
