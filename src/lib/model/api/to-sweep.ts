import type { z } from 'zod';
import type { SweepOptions } from '../../stats/sweep/types';
import { isoMoment } from './shapes/moment';
import type { sweepSchema } from './shapes/sweep';

interface Saved {
  id: string;
  name: string;
  notes: string | null;
  sha256: string;
  options: SweepOptions;
  engineVersion: string;
  datasets: z.output<typeof sweepSchema>['swept'];
  by: string | null;
  createdAt: number;
}

/**
 * A sweep as the API tells it.
 *
 * @param statement the answer of its document; null when that cannot be read
 */
export function toSweep(sweep: Saved, statement: string | null): z.output<typeof sweepSchema> {
  const { axis, timeUnit, unit, window, transition, alpha } = sweep.options;
  return {
    id: sweep.id,
    name: sweep.name,
    axis,
    datasets: sweep.datasets.length,
    statement,
    by: sweep.by,
    createdAt: isoMoment(sweep.createdAt),
    notes: sweep.notes,
    swept: sweep.datasets.map(({ id, name, digest, device, firmware, group }) => ({
      id,
      name,
      digest,
      device,
      firmware,
      group
    })),
    timeUnit,
    unit,
    window,
    transition,
    alpha,
    engineVersion: sweep.engineVersion,
    sha256: sweep.sha256
  };
}
