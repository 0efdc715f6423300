import { reportPdf } from '$lib/pdf/report-pdf';
import { serverFonts } from '$lib/server/pdf/fonts';
import { describe, expect, it } from 'vitest';
import { BLIND, DOCUMENTS } from './documents';
import { readPdf, type ReadPdf } from './read-pdf';

interface Node {
  type: string;
  object: string;
  kids: Node[];
  /** What it marks, "page object, number". */
  marks: string[];
}

const reference = (text: string, key: string): number | null => {
  const found = text.match(new RegExp(`/${key} (\\d+) 0 R`));
  return found ? Number(found[1]) : null;
};

/** The tree of tags below its root (ISO 32000-1, 14.7). */
function treeOf({ objects }: ReadPdf): Node {
  const read = (id: number): Node => {
    const object = objects.get(id) ?? '';
    const own = reference(object.replace(/\/K \[[\s\S]*?\]/, ''), 'Pg');
    const node: Node = { type: object.match(/\/S \/(\w+)\n/)?.[1] ?? 'root', object, kids: [], marks: [] };
    for (const [, inner, child, mark] of (object.match(/\/K \[([\s\S]*?)\]/)?.[1] ?? '').matchAll(
      /<<([\s\S]*?)>>|(\d+) 0 R|(\d+)/g
    )) {
      if (child !== undefined) node.kids.push(read(Number(child)));
      else if (mark !== undefined) node.marks.push(`${own} ${mark}`);
      else if (inner.includes('/MCID'))
        node.marks.push(`${reference(inner, 'Pg') ?? own} ${inner.match(/\/MCID (\d+)/)?.[1]}`);
    }
    return node;
  };
  const root = [...objects].find(([, object]) => /\/Type \/StructTreeRoot/.test(object));
  return read(root?.[0] ?? 0);
}

const inOrder = (node: Node): Node[] => [node, ...node.kids.flatMap(inOrder)];

/** Contents of the pages, each with the number of its page object. */
function pagesOf({ objects }: ReadPdf): [id: number, object: string, content: string][] {
  return [...objects]
    .filter(([, object]) => /\/Type \/Page\n/.test(object))
    .map(([id, object]) => [id, object, objects.get(reference(object, 'Contents') ?? 0) ?? '']);
}

/** Operators that put something on the page: strokes, fills, text, images (ISO 32000-1, annex A). */
const PAINTS = /(?:^|\s)(?:S|s|f|F|f\*|B|B\*|b|b\*|sh|Do|TJ|Tj|'|")$/;

// PDF/UA-1 is ISO 14289-1; the clauses below are its own.
describe.each(DOCUMENTS)('the structure of the report of %s', (_name, make) => {
  let pdf: ReadPdf;
  let nodes: Node[];
  it('marks all that is drawn, as content or as an adornment (7.1)', async () => {
    const input = { document: await make(), documentSha256: 'ab'.repeat(32), provenance: BLIND };
    pdf = readPdf(await reportPdf(input, serverFonts, { compress: false }));
    nodes = inOrder(treeOf(pdf));
    let painted = 0;
    for (const [, , content] of pagesOf(pdf)) {
      let depth = 0;
      for (const command of content.split('\n')) {
        if (/(BDC|BMC)$/.test(command)) depth++;
        else if (command === 'EMC') depth--;
        else if (PAINTS.test(command)) {
          painted++;
          expect(depth, command.slice(0, 60)).toBe(1);
        }
      }
      expect(depth).toBe(0);
    }
    expect(painted).toBeGreaterThan(100);
  });

  it('has every marked piece in the tree once, and no other (7.1)', () => {
    const drawn = pagesOf(pdf).flatMap(([id, , content]) =>
      [...content.matchAll(/\/MCID (\d+)/g)].map(([, mark]) => `${id} ${mark}`)
    );
    const told = nodes.flatMap(({ marks }) => marks);
    expect(new Set(drawn).size).toBe(drawn.length);
    expect([...told].sort()).toEqual([...drawn].sort());
  });

  it('has pages of their own in the tree of parents, with tabs in its order (7.18.3)', () => {
    const parents = pagesOf(pdf).map(([, object]) => object.match(/\/StructParents (\d+)/)?.[1]);
    expect(parents).not.toContain(undefined);
    expect(new Set(parents).size).toBe(pdf.pages);
    for (const [, object] of pagesOf(pdf)) expect(object).toMatch(/\/Tabs \/S\n/);
  });

  it('has headings that skip no level, one title first (7.4.2)', () => {
    const levels = nodes
      .map(({ type }) => Number(type.match(/^H(\d)$/)?.[1] ?? 0))
      .filter((level) => level > 0);
    expect(levels[0]).toBe(1);
    expect(levels.filter((level) => level === 1)).toHaveLength(1);
    levels.reduce((before, level) => {
      expect(level).toBeLessThanOrEqual(before + 1);
      return level;
    });
  });

  it('has figures and formulas with words for who cannot see them (7.3, 7.7)', () => {
    const pictures = nodes.filter(({ type }) => type === 'Figure' || type === 'Formula');
    expect(pictures.length).toBeGreaterThan(6);
    for (const { object, type } of pictures) {
      expect(object).toMatch(/\/Alt \(/);
      if (type === 'Figure') expect(object).toMatch(/\/BBox \[/);
    }
  });

  it('has notes in the margin on the page of what they are about', () => {
    const pageOf = (mark: string) => pagesOf(pdf).findIndex(([id]) => id === Number(mark.split(' ')[0]));
    const rows = nodes
      .filter(({ type, kids }) => type === 'Sect' && kids.some((kid) => kid.type === 'Div'))
      .flatMap(({ kids }) => kids.map((kid, i) => [kid, kids[i + 1]]))
      // The notes of a row are the only ones to hold sections of their own.
      .filter(([, notes]) => notes?.type === 'Div' && notes.kids.every(({ type }) => type === 'Sect'));
    expect(rows.length).toBeGreaterThan(6);
    for (const [row, notes] of rows) {
      const [first] = inOrder(row).flatMap(({ marks }) => marks);
      const stand = inOrder(notes).flatMap(({ marks }) => marks.map(pageOf));
      expect([...new Set(stand)]).toEqual([pageOf(first)]);
    }
  });

  it('has tables of rows of equal length, whose heads say what they head (7.5)', () => {
    const tables = nodes.filter(({ type }) => type === 'Table');
    expect(tables.length).toBeGreaterThan(2);
    for (const table of tables) {
      const rows = table.kids.filter(({ type }) => type === 'TR');
      expect(table.kids.filter(({ type }) => type === 'Caption')).toHaveLength(1);
      expect(table.kids).toHaveLength(rows.length + 1);
      const widths = rows.map(({ kids }) =>
        kids.reduce((sum, { object }) => sum + Number(object.match(/\/ColSpan (\d+)/)?.[1] ?? 1), 0)
      );
      expect(new Set(widths).size, `${widths.join(' ')}`).toBe(1);
      for (const { kids } of rows)
        for (const { type, object } of kids) {
          expect(['TH', 'TD']).toContain(type);
          if (type === 'TH') expect(object).toMatch(/\/Scope \/(Row|Column)/);
        }
      expect(rows[0].kids.every(({ type }) => type === 'TH')).toBe(true);
    }
  });

  it('has lists of entries, each with its sign and its body (7.6)', () => {
    for (const { kids } of nodes.filter(({ type }) => type === 'L'))
      for (const entry of kids)
        expect([entry.type, ...entry.kids.map(({ type }) => type)]).toEqual(['LI', 'Lbl', 'LBody']);
  });

  it('says its language and shows its title (7.1, 7.2)', () => {
    const all = [...pdf.objects.values()];
    const catalog = all.find((object) => /\/Type \/Catalog/.test(object)) ?? '';
    expect(catalog).toMatch(/\/Lang \(en\)/);
    expect(all.some((object) => /\/DisplayDocTitle true/.test(object))).toBe(true);
    expect(all.some((object) => /<dc:title>[\s\S]*Severalty report/.test(object))).toBe(true);
  });
});
