import type { Workspace } from './workspace';

/** Σ_cells ∂L/∂f · change. */
export function weigh(space: Workspace, change: Float64Array): number {
  const { single } = space;
  const cells = space.data.shots.length;
  let sum = 0;
  for (let i = 0; i < cells; i++) sum += single[i] * change[i];
  return (
    sum +
    space.lumpSingle * change[cells] +
    space.emptySingle * change[cells + 1] +
    space.belowSingle * change[cells + 2]
  );
}

/** −Σ_cells ∂²L/∂f² · a · b. */
export function information(space: Workspace, a: Float64Array, b: Float64Array): number {
  const { double } = space;
  const cells = space.data.shots.length;
  let sum = 0;
  for (let i = 0; i < cells; i++) sum += double[i] * a[i] * b[i];
  return (
    sum +
    space.lumpDouble * a[cells] * b[cells] +
    space.emptyDouble * a[cells + 1] * b[cells + 1] +
    space.belowDouble * a[cells + 2] * b[cells + 2]
  );
}
