import type { Workspace } from './workspace';

/**
 * Change of each cell's probability: (uf)_n = f_{n−1} − f_n for power 1, (u²f)_n for 2, and for −1 what a
 * sure trial leaving 1 does, f_{n+1} − f_n. Entries: data.shots cells, then the lump, then n = 0 if set
 * aside, then the opening row. `f` starts at space.first; `out` receives them.
 */
export function cellChange(space: Workspace, f: Float64Array, power: 1 | 2 | -1, out: Float64Array): void {
  const { data, length } = space;
  const cells = data.shots.length;
  const shift = data.first - space.first;
  // Cells outside the window were never seen (their likelihood would be 0), so they are left at 0.
  const from = Math.min(cells, Math.max(0, -shift));
  const to = Math.max(from, Math.min(cells, length - shift));
  for (let i = 0; i < from; i++) out[i] = 0;
  for (let i = to; i < cells + 3; i++) out[i] = 0;
  if (power === -1) {
    for (let i = from; i < to; i++) out[i] = at(f, i + shift + 1, length) - f[i + shift];
  } else {
    let before = at(f, from + shift - 1, length);
    let earlier = at(f, from + shift - 2, length);
    for (let i = from; i < to; i++) {
      const here = f[i + shift];
      out[i] = power === 1 ? before - here : earlier - 2 * before + here;
      earlier = before;
      before = here;
    }
  }
  // Sums from a count on telescope: Σ_{k≥c} (uf)_k = f_{c−1}, Σ (u²f)_k = f_{c−2} − f_{c−1}.
  if (data.lump) {
    const c = data.lump.from - space.first;
    if (power === 1) out[cells] = at(f, c - 1, length);
    else if (power === 2) out[cells] = at(f, c - 2, length) - at(f, c - 1, length);
    else out[cells] = -at(f, c, length);
  }
  // Up to a count likewise: Σ_{k≤c} (uf)_k = −f_c, Σ (u²f)_k = f_c − f_{c−1}.
  if (data.below) {
    const c = data.below.to - space.first;
    if (power === 1) out[cells + 2] = -at(f, c, length);
    else if (power === 2) out[cells + 2] = at(f, c, length) - at(f, c - 1, length);
    else out[cells + 2] = at(f, c + 1, length);
  }
  if (space.emptySingle !== 0) {
    const none = at(f, -space.first, length);
    out[cells + 1] = power === -1 ? at(f, 1 - space.first, length) - none : power === 1 ? -none : none;
  }
}

function at(f: Float64Array, n: number, length: number): number {
  return n >= 0 && n < length ? f[n] : 0;
}
