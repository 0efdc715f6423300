import type { Block, Part } from '../blocks/blocks';
import type { SweepPdfInput } from '../sweep-input';
import { sayWhen } from './say-when';

/** Which document this is, and who made it unless that is not told. */
export function sweepProvenancePart(input: SweepPdfInput): Part {
  const { documentSha256, engineVersion, madeBy, team, madeAt, notes, link } = input;
  const facts: [string, string | null][] = [
    ['Document', `sha256:${documentSha256}`],
    ['Engine', `Severalty ${engineVersion}`],
    ['Made by', madeBy],
    ['Team', team],
    ['Made', madeAt && sayWhen(madeAt)]
  ];
  const noted: Block[] = notes?.trim()
    ? [
        { kind: 'paragraph', text: 'Notes', look: 'strong' },
        ...notes
          .split(/\r?\n/)
          .filter((line) => line.trim() !== '')
          .map((text): Block => ({ kind: 'paragraph', text }))
      ]
    : [];
  const address: Block[] = link
    ? [
        { kind: 'paragraph', text: 'This sweep can be read at', look: 'strong' },
        { kind: 'link', address: link }
      ]
    : [];
  return {
    title: 'Where this result comes from',
    rows: [
      {
        blocks: [
          {
            kind: 'facts',
            facts: facts.flatMap(([what, value]) => (value ? [[what, value] as [string, string]] : []))
          },
          ...noted,
          ...address
        ],
        notes: [
          {
            title: 'The same again',
            paragraphs: [
              'The same datasets, options and engine give the same document, byte for byte; nothing in it is drawn at random. The same document gives this file.'
            ]
          }
        ]
      }
    ]
  };
}
