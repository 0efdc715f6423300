import { reportPdf } from '$lib/pdf/report-pdf';
import { serverFonts } from '$lib/server/pdf/fonts';
import { describe, expect, it } from 'vitest';
import { anyDiagnosis, WELDON } from '../../charts/any-diagnosis';
import { BLIND } from '../documents';
import { readPdf } from '../read-pdf';

describe('a packed file', () => {
  it('holds the objects of the plain one, every one of them, in less than half the bytes of their text', async () => {
    const document = await anyDiagnosis(WELDON, { trials: 12 });
    const input = { document, documentSha256: 'ab'.repeat(32), provenance: BLIND };
    const [plain, packed] = [
      await reportPdf(input, serverFonts, { compress: false }),
      await reportPdf(input, serverFonts)
    ];
    const [one, other] = [plain, packed].map((bytes) => readPdf(bytes));
    expect(packed.length).toBeLessThan(plain.length / 2);
    expect(other.text).toBe(one.text);
    expect(other.pages).toBe(one.pages);
    let compared = 0;
    for (const [id, object] of one.objects) {
      // What is a stream differs by its keys, since it is packed.
      if (object.includes('stream\n')) continue;
      expect(other.objects.get(id)?.trim(), String(id)).toBe(object.trim());
      compared++;
    }
    expect(compared).toBeGreaterThan(800);
    const file = Buffer.from(packed).toString('latin1');
    // ISO 32000-1, 7.5.8: the place of the stream of places stands at the end, and it leads to the catalogue.
    const at = Number(/startxref\n(\d+)\n%%EOF\n$/.exec(file)?.[1]);
    expect(file.slice(at)).toMatch(/^\d+ 0 obj\n<<\n\/Type \/XRef\n\/Size \d+\n\/W \[1 4 2\]\n/);
    const root = Number(/\/Root (\d+) 0 R/.exec(file.slice(at))?.[1]);
    expect(other.objects.get(root)).toContain('/Type /Catalog');
  });
});
