import type { FrozenConditions } from '../team/frozen-conditions';
import type { DiagnoseOptions, Verdict } from '../../stats/types';
import { isoMoment } from './shapes/moment';
import type { ApiReport } from './shapes/report';

interface Saved {
  id: string;
  number: number;
  datasetId: string;
  sha256: string;
  options: DiagnoseOptions;
  engineVersion: string;
  verdict: Verdict;
  conditions: FrozenConditions;
  conditionsNow: FrozenConditions;
  by: string | null;
  createdAt: number;
}

/**
 * A report as the API tells it.
 *
 * @param statement the answer of its document; null when that cannot be read
 * @param at address of the report in the API
 */
export function toReport(report: Saved, statement: string | null, at: string): ApiReport {
  const { trials, unit, geometry, misread, alpha, tolerance, resamples, seed } = report.options;
  return {
    id: report.id,
    number: report.number,
    dataset: { id: report.datasetId, name: report.conditionsNow.name },
    verdict: report.verdict,
    engineVersion: report.engineVersion,
    by: report.by,
    createdAt: isoMoment(report.createdAt),
    statement,
    sha256: report.sha256,
    conditions: report.conditions,
    options: {
      trials,
      unit,
      geometry,
      misread,
      misreadUncertainty: report.options.misreadUncertainty ?? null,
      kept: report.options.kept ?? null,
      alpha,
      tolerance,
      resamples,
      seed
    },
    files: {
      document: `${at}/document.json`,
      numbers: `${at}/numbers.csv`,
      distribution: `${at}/distribution.csv`,
      tails: `${at}/tails.csv`,
      pdf: `${at}/report.pdf`,
      bundle: `${at}/bundle.zip`
    }
  };
}
