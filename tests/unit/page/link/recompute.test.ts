import { documentText } from '$lib/model/document-text';
import { Recompute, sha256Of } from '$lib/page/link/recompute.svelte';
import { createHash } from 'node:crypto';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { diagnoseNine, nineCounts } from '../../../support/links';

/** Stands in for the worker, which is not there outside a browser. */
const startRun = vi.hoisted(() => vi.fn());
vi.mock('$lib/page/runner', () => ({ startRun }));

async function stored() {
  const { document: diagnosis, options } = await diagnoseNine();
  const document = documentText(diagnosis);
  startRun.mockReturnValue({ result: Promise.resolve({ ok: true, diagnosis }), cancel: () => undefined });
  const sha256 = createHash('sha256').update(document, 'utf8').digest('hex');
  return { document, sha256, options, counts: nineCounts };
}

beforeEach(() => startRun.mockReset());

describe('Recompute', () => {
  it('finds a document that came as it is stored the same', async () => {
    const given = await stored();
    const work = new Recompute();
    await work.start(given);
    expect(work.outcome).toEqual({ kind: 'same', sha256: given.sha256 });
  });

  it('says that a document was changed on the way, by a byte too, and computes nothing', async () => {
    const given = await stored();
    const document = given.document.replace('137', '138');
    expect(document).not.toBe(given.document);
    const work = new Recompute();
    for (const changed of [document, `${given.document} `]) {
      await work.start({ ...given, document: changed });
      expect(work.outcome).toEqual({ kind: 'changed', received: sha256Of(changed) });
    }
    expect(startRun).not.toHaveBeenCalled();
  });
});
