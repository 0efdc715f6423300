import type { Diagnosis, Flag } from '$lib/stats/types';
import { formatCount, formatNumber } from '../format-number';
import { rounded } from './rounded';

type Words = Pick<Diagnosis, 'answer' | 'flags' | 'cautions'>;

/** The sentences of a report without numbers of shots in a tail, without resamples, and at three digits. */
export function summaryWords(diagnosis: Diagnosis): Words {
  const shots = formatCount(diagnosis.data.shots);
  const plain = (text: string) => atThreeDigits(withoutResamples(text), shots);
  return {
    answer: {
      ...diagnosis.answer,
      statement: plain(diagnosis.answer.statement),
      because: reasons(diagnosis).map(plain)
    },
    flags: diagnosis.flags.map((flag) => ({ ...flag, size: plain(sizeOf(flag)) })),
    cautions: diagnosis.cautions.map(withoutResamples)
  };
}

/** Flags about one count, or one half of them, give the shots with it; their words stay, their size goes. */
const sizeOf = ({ id, size }: Flag): string => (id === 'dead-shots' || id === 'pairing' ? '' : size);

/** Reasons of the answer; the certificate's names the shots in a tail, so only its p is told. */
function reasons({ answer, tails }: Diagnosis): string[] {
  return answer.because.map((reason) =>
    reason.startsWith('Exact certificate') && tails.certificate
      ? `Exact certificate, without fit or simulation, of a tail heavier than independent trials allow (p at most ${formatNumber(tails.certificate.p, 2)}).`
      : reason
  );
}

const NUMBER = String.raw`\d[\d\u202f]*`;
const IN_BRACKETS = new RegExp(`, ${NUMBER} resamples(?=\\))`, 'g');
const WITH = new RegExp(`with ${NUMBER} resamples`, 'g');
const SMALLEST = new RegExp(`^The smallest p that ${NUMBER} resamples can show is .*; the truth`);

/** Who knows seed and resamples can run a guessed histogram and compare: neither is told, in words neither. */
function withoutResamples(text: string): string {
  return text
    .replace(IN_BRACKETS, '')
    .replace(WITH, 'with the resamples drawn')
    .replace('; the draws made stand with each test.', '.')
    .replace(SMALLEST, 'Some p are the smallest that the resamples drawn can show; the truth');
}

/** Numbers in a sentence at three significant digits, but for the number of shots, which is told as it is. */
function atThreeDigits(text: string, shots: string): string {
  return text.replace(new RegExp(`${NUMBER}(?:\\.\\d+)?`, 'g'), (found) => {
    const digits = found.replace(/[\u202f.]/g, '').replace(/^0+/, '');
    const value = Number(found.replaceAll('\u202f', ''));
    if (found === shots || digits.length <= 3 || rounded(value) === value) return found;
    return Number.isInteger(rounded(value)) ? formatCount(rounded(value)) : formatNumber(value, 3);
  });
}
