import { documentText } from '$lib/model/document-text';
import { readDocument } from '$lib/model/read-document';
import { describe, expect, it } from 'vitest';
import { diagnoseInvented } from '../../support/saved-reports';

describe('readDocument', () => {
  it('gives back what documentText wrote', async () => {
    const { document } = await diagnoseInvented();
    expect(readDocument(documentText(document))).toEqual({ ok: true, diagnosis: document });
  });

  it('says where a document is wrong', async () => {
    const { document } = await diagnoseInvented();
    const broken = { ...document, tests: [{ ...document.tests[0], p: 2 }] };
    expect(readDocument(JSON.stringify(broken))).toMatchObject({
      ok: false,
      problem: expect.stringMatching(/^at tests\[0\]\.p: /)
    });
  });

  it.each(['', '{"format":', 'null', '[]', '{"format":"other/1"}'])('refuses %j', (text) => {
    expect(readDocument(text)).toMatchObject({ ok: false, problem: expect.stringMatching(/\S/) });
  });
});
