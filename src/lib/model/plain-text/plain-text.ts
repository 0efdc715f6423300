import type { Diagnosis } from '$lib/stats/types';
import { VERDICTS } from '../labels';
import { sayCounts } from './say-counts';
import { sayData } from './say-data';
import { sayExplanations } from './say-explanations';
import { NUISANCES_TITLE, sayNuisances } from '../report/say-nuisances';
import { sayFlags } from './say-flags';
import { sayLaw } from './say-law';
import { sayTests } from './say-tests';
import { wrap } from './wrap';

/**
 * A diagnosis in plain text, for a terminal, a log or a mail: the answer first, then what else it
 * could be, the tests, the best law, the counts, and the cautions. Says only what the document
 * says, and ends with a line end.
 *
 * @param about lines about the input, shown under "Data": how the file was read.
 */
export function plainText(diagnosis: Diagnosis, about: string[] = []): string {
  const { answer, cautions } = diagnosis;
  const parts = [
    `${VERDICTS[answer.verdict]}\n\n${wrap(answer.statement)}\n${answer.because.map((reason) => wrap(reason, '  – ')).join('\n')}`,
    sayData(diagnosis, about),
    sayFlags(diagnosis.flags),
    ...(diagnosis.explanations ? [sayExplanations(diagnosis.explanations, diagnosis.engine.alpha)] : []),
    nuisances(diagnosis),
    sayTests(diagnosis),
    sayLaw(diagnosis),
    sayCounts(diagnosis),
    `Cautions\n${cautions.map((caution) => wrap(caution, '  – ')).join('\n')}`
  ];
  return `${parts.join('\n\n')}\n`;
}

const nuisances = (diagnosis: Diagnosis): string =>
  [
    NUISANCES_TITLE,
    ...sayNuisances(diagnosis, null).map(([what, known]) => wrap(`${what}. ${known}`, '  ', '    '))
  ].join('\n');
