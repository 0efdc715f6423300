import type { Workspace } from './workspace';

/**
 * Change of each cell's probability: (uf)_n = f_{n−1} − f_n for power 1, (u²f)_n for 2, and for −1 what a
 * sure trial leaving 1 does, f_{n+1} − f_n. Entries: data.shots cells, then the lump, then n = 0 if set
 * aside. `f` starts at space.first; `out` receives them.
 */
export function cellChange(space: Workspace, f: Float64Array, power: 1 | 2 | -1, out: Float64Array): void {
  const { data, length } = space;
  const cells = data.shots.length;
  out.fill(0);
  const shift = data.first - space.first;
  // Cells outside the window were never seen (their likelihood would be 0), so they are left at 0.
  const from = Math.max(0, -shift);
  const to = Math.min(cells, length - shift);
  let k = from + shift;
  let before = k > 0 ? f[k - 1] : 0;
  let earlier = k > 1 ? f[k - 2] : 0;
  for (let i = from; i < to; i++, k++) {
    const here = f[k];
    if (power === 1) out[i] = before - here;
    else if (power === 2) out[i] = earlier - 2 * before + here;
    else out[i] = (k + 1 < length ? f[k + 1] : 0) - here;
    earlier = before;
    before = here;
  }
  const at = (n: number) => (n >= 0 && n < length ? f[n] : 0);
  // Sums from a count on telescope: Σ_{k≥c} (uf)_k = f_{c−1}, Σ (u²f)_k = f_{c−2} − f_{c−1}.
  if (data.lump) {
    const c = data.lump.from - space.first;
    out[cells] = power === 1 ? at(c - 1) : power === 2 ? at(c - 2) - at(c - 1) : -at(c);
  }
  if (space.emptySingle !== 0) out[cells + 1] = power === -1 ? at(1) - f[0] : power === 1 ? -f[0] : f[0];
}
