import type { Frame, Point } from './picture';

/** Part of the segment a→b inside the frame (Liang & Barsky 1984), or null when it passes outside. */
function clipSegment(a: Point, b: Point, frame: Frame): [Point, Point] | null {
  const run = b[0] - a[0];
  const rise = b[1] - a[1];
  let enter = 0;
  let leave = 1;
  const sides: Point[] = [
    [-run, a[0] - frame.left],
    [run, frame.right - a[0]],
    [-rise, a[1] - frame.top],
    [rise, frame.bottom - a[1]]
  ];
  for (const [step, room] of sides) {
    if (step === 0) {
      if (room < 0) return null;
    } else if (step < 0) enter = Math.max(enter, room / step);
    else leave = Math.min(leave, room / step);
  }
  if (enter > leave) return null;
  const at = (share: number): Point => [a[0] + share * run, a[1] + share * rise];
  return [at(enter), at(leave)];
}

/**
 * Cuts a broken line to the frame.
 * @param points picture units; null breaks the line
 * @returns runs of at least two points, each wholly inside the frame
 */
export function clipLine(points: (Point | null)[], frame: Frame): Point[][] {
  const runs: Point[][] = [];
  let run: Point[] = [];
  const close = () => {
    if (run.length > 1) runs.push(run);
    run = [];
  };
  for (let i = 1; i < points.length; i++) {
    const a = points[i - 1];
    const b = points[i];
    const kept = a && b ? clipSegment(a, b, frame) : null;
    if (!kept) {
      close();
      continue;
    }
    const last = run.at(-1);
    if (!last || last[0] !== kept[0][0] || last[1] !== kept[0][1]) {
      close();
      run.push(kept[0]);
    }
    run.push(kept[1]);
  }
  close();
  return runs;
}
