import type { Geometry, Unit } from '../../stats/types';
import { normaliseName } from '../table/normalise-name';

/** What was counted on, from the usual words; null for others. */
export function readGeometry(cell: string): Geometry | null {
  const words = normaliseName(cell);
  if (/\b(ring|periodic|closed|ring bonds)\b/.test(words)) return 'ring-bonds';
  if (/\b(open|bonds?|chain)\b/.test(words)) return 'open-bonds';
  return /\b(sites?)\b/.test(words) ? 'sites' : null;
}

/** What one count stands for, from the usual words; null for others. */
export function readUnit(cell: string): Unit | null {
  const words = normaliseName(cell);
  if (/\bpairs?\b/.test(words)) return 'pair';
  return /\b(defects?|single|singles|kinks?)\b/.test(words) ? 'defect' : null;
}
