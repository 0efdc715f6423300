import type { Diagnosis } from '$lib/stats/types';
import { VERDICTS } from '$lib/model/labels';
import type { Provenance } from '../report-input';
import { cleanText } from '../type/clean-text';

/** Title, subject and dates of the file. Without a time of its own the file has the oldest date there is. */
export function infoOf(
  { answer, engine }: Pick<Diagnosis, 'answer'> & { engine: Pick<Diagnosis['engine'], 'version'> },
  { dataset, madeBy, madeAt }: Provenance,
  more: string
): Record<string, string | Date> {
  const date = madeAt ?? new Date(0);
  const name = dataset ? `: ${cleanText(dataset)}` : '';
  return {
    Title: `Severalty report${name}`,
    Subject: `${VERDICTS[answer.verdict]}.${more}`,
    Creator: `Severalty ${engine.version}`,
    Producer: 'pdfkit 0.20.2',
    CreationDate: date,
    ModDate: date,
    ...(madeBy ? { Author: cleanText(madeBy) } : {})
  };
}

const escaped = (text: string): string =>
  text.replace(/[&<>]/g, (sign) => ({ '&': '&amp;', '<': '&lt;' })[sign] ?? '&gt;');

/** What pdfkit keeps from its types: it writes the file's title into XML as it stands. */
interface WritesMetadata {
  info: Record<string, unknown>;
  _addInfo(): void;
}

/** Makes names such as "<b> & co" safe in the XML of the file's metadata. */
export function escapeMetadata(doc: PDFKit.PDFDocument): void {
  const writer = doc as unknown as WritesMetadata;
  const write = writer._addInfo.bind(doc);
  writer._addInfo = () => {
    const plain = writer.info;
    writer.info = Object.fromEntries(
      Object.entries(plain).map(([key, value]) => [key, typeof value === 'string' ? escaped(value) : value])
    );
    write();
    writer.info = plain;
  };
}
