import type { FitData } from './fit-data';
import type { StepBuffers } from './step-buffers';

/**
 * Buffers of one fit, made once and used again by every step: a refit of a short histogram takes about
 * a hundred microseconds, and fresh arrays would be half of that.
 */
export interface Workspace {
  data: FitData;
  /** f over counts first … first+length−1, the rest of the buffer unspecified. */
  f: Float64Array;
  first: number;
  length: number;
  /** Scratch of the same capacity. */
  spare: Float64Array;
  part: Float64Array;
  g: Float64Array;
  gg: Float64Array;
  /** Change of each cell with each level; see slopes. */
  tangents: Float64Array[];
  /** Change of each cell with a move; see pulls. */
  change: Float64Array;
  /** ∂L/∂f and −∂²L/∂f² of single cells, by data.shots index; the buffers may be longer. */
  single: Float64Array;
  double: Float64Array;
  /** Second difference w_n − 2w_{n+1} + w_{n+2} of ∂L/∂f over the window: Σ w (u²g) = Σ bent·g. */
  bent: Float64Array;
  lumpSingle: number;
  lumpDouble: number;
  belowSingle: number;
  belowDouble: number;
  emptySingle: number;
  emptyDouble: number;
  /** Σ bent·g and Σ bent·gg of the last removal; see levelRemoval. */
  sums: { single: number; double: number };
  /** For each number of levels that has come up; see stepBuffers. */
  sized: StepBuffers[];
}

/** As many counts, and levels, fit at first. */
const capacity = 64;
const usualLevels = 10;

/**
 * Buffers for a histogram; they grow when a law needs more room.
 *
 * @param again a workspace that is no longer needed: its buffers are taken over where they are long enough, and
 *   the pmf it held is lost. Typed arrays of this size live outside the young heap, and fresh ones for each of
 *   2000 resamples were a sixth of the time of a diagnosis at N = 12.
 */
export function workspace(data: FitData, again?: Workspace): Workspace {
  const cells = data.shots.length;
  if (again && again.single.length >= cells) {
    again.data = data;
    again.single.fill(0, 0, cells);
    again.double.fill(0, 0, cells);
    return again;
  }
  // Room for the next resample, which may reach a few counts further.
  const room = cells + 8;
  // All fields at once, and fractions from the start: the engine compiles anew for each shape that it meets.
  return {
    data,
    f: new Float64Array(capacity),
    first: 0,
    length: 0,
    spare: new Float64Array(capacity),
    part: new Float64Array(capacity),
    g: new Float64Array(capacity),
    gg: new Float64Array(capacity),
    tangents: Array.from({ length: usualLevels }, () => new Float64Array(room + 3)),
    change: new Float64Array(room + 3),
    single: new Float64Array(room),
    double: new Float64Array(room),
    bent: new Float64Array(capacity + 2),
    lumpSingle: NaN,
    lumpDouble: NaN,
    belowSingle: NaN,
    belowDouble: NaN,
    emptySingle: NaN,
    emptyDouble: NaN,
    sums: { single: NaN, double: NaN },
    sized: []
  };
}

/** Makes room for windows of `length` counts; f is kept. */
export function reserve(space: Workspace, length: number): void {
  if (space.f.length >= length) return;
  const room = Math.ceil(length * 1.5);
  const f = new Float64Array(room);
  f.set(space.f.subarray(0, space.length));
  space.f = f;
  space.spare = new Float64Array(room);
  const part = new Float64Array(room);
  part.set(space.part);
  space.part = part;
  space.g = new Float64Array(room);
  space.gg = new Float64Array(room);
  space.bent = new Float64Array(room + 2);
}
