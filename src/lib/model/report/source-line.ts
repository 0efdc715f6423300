import type { Diagnosis } from '$lib/stats/types';
import { formatCount } from '../format-number';

/** One line under a saved chart that says where its numbers come from. */
export const sourceLine = ({ engine, data }: Diagnosis, name: string | null): string =>
  `Severalty ${engine.version}. ${name ? `${name}, ` : ''}${formatCount(data.shots)} shots, ` +
  `${data.digest.slice(0, 19)}, seed ${engine.seed}.`;
