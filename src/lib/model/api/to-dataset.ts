import type { OneDataset } from '../team/datasets/one-dataset';
import type { ApiDataset } from './shapes/dataset';
import { isoMoment } from './shapes/moment';

/** A dataset as the API tells it. */
export function toDataset(dataset: OneDataset): ApiDataset {
  const { conditions, histogram, file } = dataset;
  return {
    id: dataset.id,
    name: conditions.name,
    kind: dataset.kind,
    digest: dataset.digest,
    shots: dataset.shots,
    mean: dataset.mean,
    largest: dataset.largest,
    device: conditions.device,
    firmware: conditions.firmware,
    group: conditions.group,
    trials: conditions.trials,
    createdAt: isoMoment(dataset.createdAt),
    conditions,
    counts: histogram.counts.map(([count, shots]) => [count, shots]),
    lump: histogram.lump,
    below: histogram.below ?? null,
    batches: dataset.batches,
    by: dataset.by,
    file: { name: file.name, size: file.size, sha256: file.sha256 },
    reports: dataset.reports.map(({ id, number, verdict, createdAt }) => ({
      id,
      number,
      verdict,
      createdAt: isoMoment(createdAt)
    }))
  };
}
