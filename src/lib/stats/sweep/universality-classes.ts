/** A transition whose exponents are published. */
export interface UniversalityClass {
  id: string;
  name: string;
  dimension: number;
  /** ν, of the correlation length. */
  correlation: number;
  /** z, dynamic. */
  dynamic: number;
  source: string;
  /** What its exponent does not hold for. */
  note?: string;
}

/**
 * A short table of transitions to compare a sweep with. Exact values but for the 2D Ising model's z; where the source is
 * marked (m) the value stands here from memory of it.
 */
export const UNIVERSALITY_CLASSES: readonly UniversalityClass[] = [
  {
    id: 'ising-chain',
    name: 'Ising chain in a transverse field',
    dimension: 1,
    correlation: 1,
    dynamic: 1,
    source: 'Sachdev 2011, Quantum Phase Transitions, ch. 10 (m); Dziarmaga 2005, Phys. Rev. Lett. 95:245701'
  },
  {
    id: 'ising-plane',
    name: 'Ising model in two dimensions, heat bath',
    dimension: 2,
    correlation: 1,
    dynamic: 2.1665,
    note: 'That is for defects that are points; its domain walls are lines, whose length goes with ν/(1 + zν) = 0.316.',
    source:
      'ν = 1: Onsager 1944, Phys. Rev. 65:117 (m); z: Nightingale & Blöte 1996, Phys. Rev. Lett. 76:4548 (m)'
  },
  {
    id: 'mean-field-chain',
    name: 'Mean field, overdamped, one dimension',
    dimension: 1,
    correlation: 0.5,
    dynamic: 2,
    source: 'Hohenberg & Halperin 1977, Rev. Mod. Phys. 49:435 (m)'
  },
  {
    id: 'mean-field-inertial-chain',
    name: 'Mean field, underdamped, one dimension',
    dimension: 1,
    correlation: 0.5,
    dynamic: 1,
    source: 'Laguna & Zurek 1998, Phys. Rev. D 58:085021 (m)'
  }
];
