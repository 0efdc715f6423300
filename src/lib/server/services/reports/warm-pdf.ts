import type { ReadDocument } from '$lib/model/read-document';
import { log } from '../../log';
import { stackOf } from '../../running/stack-of';
import type { SavedReport } from './find-report';

let begun = false;

/**
 * Writes a report nobody asked for, once a process: the first PDF of a process takes four times the work of a later
 * one, since neither its code is compiled nor its fonts read. To be called when a report is looked at, which is when
 * one is likely to be asked for next; it waits until the page has gone out, and gives others their turn.
 */
export function warmPdf({ sha256 }: Pick<SavedReport, 'sha256'>, document: ReadDocument): void {
  if (begun || !document.ok) return;
  begun = true;
  const { diagnosis } = document;
  const unsaid = { madeBy: null, madeAt: null, team: null, dataset: null, conditions: null, link: null };
  setTimeout(() => {
    import('../../pdf/write-report')
      .then(({ writeReport }) =>
        writeReport({ document: diagnosis, documentSha256: sha256, provenance: unsaid })
      )
      // Whoever asks for one will be told what is wrong.
      .catch((error: unknown) => log('error', 'a PDF was not made beforehand', { why: stackOf(error) }));
  }, 500).unref();
}
