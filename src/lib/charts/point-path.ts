import type { Point } from './picture';

/** Shapes carry the meaning that the inks carry: up = more, down = fewer, diamond = cannot tell. */
export type Shape = 'dot' | 'up' | 'down' | 'diamond';

/**
 * Path string of points of one shape.
 * @param size side of the square that a point fills, picture units
 */
export function pointPath(points: Point[], shape: Shape = 'dot', size = 6): string {
  const area = shape === 'dot' ? (Math.PI / 4) * size * size : 0.62 * size * size;
  const draw = shape === 'dot' ? circle(area) : polygon(CORNERS[shape](area));
  return points.map(([x, y]) => draw(x, y)).join('');
}

type Draw = (x: number, y: number) => string;

/** Corners about the middle, so that the shape has the area. */
const CORNERS: Record<Exclude<Shape, 'dot'>, (area: number) => Point[]> = {
  up: (area) => triangle(area, 1),
  down: (area) => triangle(area, -1),
  diamond(area) {
    const [wide, high] = [Math.sqrt(area / (2 * Math.sqrt(3))), Math.sqrt((area * Math.sqrt(3)) / 2)];
    return [
      [0, -high],
      [wide, 0],
      [0, high],
      [-wide, 0]
    ];
  }
};

/** Of equal sides; its middle is the centre of mass. */
function triangle(area: number, sign: 1 | -1): Point[] {
  const inner = Math.sqrt(area / (3 * Math.sqrt(3)));
  return [
    [0, -2 * inner * sign],
    [Math.sqrt(3) * inner, inner * sign],
    [-Math.sqrt(3) * inner, inner * sign]
  ];
}

const polygon = (corners: Point[]): Draw => {
  return (x, y) =>
    `${corners.map(([dx, dy], i) => `${i ? 'L' : 'M'}${round(x + dx)},${round(y + dy)}`).join('')}Z`;
};

const circle = (area: number): Draw => {
  const radius = Math.round(Math.sqrt(area / Math.PI) * 1000) / 1000;
  return (x, y) => {
    const [left, right] = [round(x - radius), round(x + radius)];
    const arc = `A${radius},${radius},0,1,1,`;
    return `M${right},${round(y)}${arc}${left},${round(y)}${arc}${right},${round(y)}`;
  };
};

const round = (value: number): number => Math.round(value * 100) / 100;
