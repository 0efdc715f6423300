import { symbol, symbolCircle, symbolDiamond, symbolTriangle } from 'd3-shape';
import type { Point } from './picture';

/** Shapes carry the meaning that the inks carry: up = more, down = fewer, diamond = cannot tell. */
export type Shape = 'dot' | 'up' | 'down' | 'diamond';

const DRAWN = { dot: symbolCircle, up: symbolTriangle, down: symbolTriangle, diamond: symbolDiamond };

/**
 * Path string of points of one shape.
 * @param size side of the square that a point fills, picture units
 */
export function pointPath(points: Point[], shape: Shape = 'dot', size = 6): string {
  const area = shape === 'dot' ? (Math.PI / 4) * size * size : 0.62 * size * size;
  const unit = symbol(DRAWN[shape], area).digits(3)() ?? '';
  return points.map(([x, y]) => moved(unit, x, y, shape === 'down')).join('');
}

/** d3 draws a symbol about 0,0. Only absolute commands occur in it but the circle's arc, whose radii stay. */
function moved(path: string, x: number, y: number, turned: boolean): string {
  const sign = turned ? -1 : 1;
  return path.replace(/([MLA])([^MLAZ]*)/g, (_whole, command: string, list: string) => {
    const numbers = list.split(/[ ,]/).map(Number);
    const end = numbers.length - 2;
    const placed = numbers.map((value, i) =>
      i === end ? round(x + value) : i === end + 1 ? round(y + sign * value) : value
    );
    return command + placed.join(',');
  });
}

const round = (value: number): number => Math.round(value * 100) / 100;
