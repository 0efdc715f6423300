import type { Provenance } from '$lib/pdf/report-input';
import { reportPdf } from '$lib/pdf/report-pdf';
import { serverFonts } from '$lib/server/pdf/fonts';
import type { Diagnosis } from '$lib/stats/types';
import { beforeAll, describe, expect, it } from 'vitest';
import { anyDiagnosis, WELDON } from '../charts/any-diagnosis';
import { BLIND } from './documents';
import { readPdf } from './read-pdf';

describe('names and notes', () => {
  let document: Diagnosis;
  beforeAll(async () => {
    document = await anyDiagnosis(WELDON, { trials: 12 });
  });
  const make = async (provenance: Partial<Provenance>) => {
    const input = { document, documentSha256: 'ab'.repeat(32), provenance: { ...BLIND, ...provenance } };
    return {
      read: readPdf(await reportPdf(input, serverFonts, { compress: false })),
      bytes: await reportPdf(input, serverFonts)
    };
  };

  it('in any script are there, sign by sign', async () => {
    const { read, bytes } = await make({
      dataset: 'Łódź Приве́т Ωμέγα',
      team: '量子研究室',
      madeBy: '김민수 🙂',
      conditions: { device: 'ħω ≤ 3 kΩ', notes: 'Δt ≈ ½ → ∞' }
    });
    for (const words of ['Łódź Приве́т Ωμέγα', '量子研究室', '김민수 🙂', 'ħω ≤ 3 kΩ', 'Δt ≈ ½ → ∞'])
      expect(read.text).toContain(words);
    expect(bytes.length).toBeLessThan(300_000);
  });

  it('are told where they bear on what counts look like, whatever they hold', async () => {
    const trialsWhy = 'सभी ६० बंध <img src=x onerror=alert(1)>';
    const postSelection = '🧊 <script>alert(2)</script> \u202eabc';
    const { read } = await make({ conditions: { trialsWhy, postSelection } });
    expect(read.text).toContain('<img src=x onerror=alert(1)>');
    expect(read.text).toContain('<script>alert(2)</script> abc');
    expect(read.text).not.toMatch(/[\u202a-\u202e\u2066-\u2069\ufffd]/);
    // The letters of the script, sign by sign; how they join is a plain form.
    for (const sign of 'सभीबंध६०') expect(read.text).toContain(sign);
    expect(read.unmarked).toEqual([]);
  });

  it('that no font has are spelled out', async () => {
    const { read } = await make({ dataset: 'cell \u{1fae8}' });
    expect(read.text).toContain('cell ⟨U+1FAE8⟩');
  });

  it('with markup are shown as they were typed, and leave the metadata whole', async () => {
    const { read } = await make({ dataset: '</rdf:li><b>A & B</b>', madeBy: '<script>alert(1)</script>' });
    expect(read.text).toContain('</rdf:li><b>A & B</b>');
    const metadata = [...read.objects.values()].find((object) => /xpacket begin/.test(object)) ?? '';
    expect(metadata).toContain('Severalty report: &lt;/rdf:li&gt;&lt;b&gt;A &amp; B&lt;/b&gt;');
    expect(metadata).not.toContain('<script>');
  });

  it('from the right keep their order, and cannot turn what follows', async () => {
    const { read } = await make({ conditions: { notes: 'שלום עולם\nfirmware \u202e1.2 gpj.exe' } });
    // On paper the second word stands left of the first; each keeps its letters from right to left.
    expect(read.text).toContain('םלוע םולש');
    expect(read.text).toContain('firmware 1.2 gpj.exe');
    expect(read.text).not.toContain('\u202e');
  });

  it('of any length are broken, not cut', async () => {
    const name = 'x'.repeat(400);
    const { read } = await make({ dataset: name });
    expect(read.text.replaceAll(' ', '')).toContain(name);
  });

  it('are left out of a blind report, dates too', async () => {
    const { read } = await make({});
    expect(read.text).not.toMatch(/Made by|Team|UTC/);
    const info = [...read.objects.values()].join('\n');
    expect(info).not.toContain('/Author');
    expect(info.match(/\(D:\d{14}Z\)/g)?.every((date) => date.startsWith('(D:19700101'))).toBe(true);
  });

  it('give the file the time of the report', async () => {
    const { read } = await make({ madeAt: new Date('2026-11-03T14:05:00Z') });
    expect(read.text).toContain('3 November 2026, 14:05 UTC');
    expect([...read.objects.values()].join('\n')).toContain('(D:20261103140500Z)');
  });

  it('that are no address of the web make no link', async () => {
    const { read } = await make({ link: 'javascript:alert(1)' });
    expect(read.text).toContain('javascript:alert(1)');
    expect([...read.objects.values()].some((object) => /\/Subtype \/Link/.test(object))).toBe(false);
  });
});
