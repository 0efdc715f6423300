import type { ImportArchive } from '$lib/server/services/transfer/import-archive';

const BEGIN = {
  'not-a-zip': 'This is not an archive that a team exported here.',
  'not-an-archive': 'This zip is not an archive that a team exported here, or one of a later version.',
  'too-large': 'This archive would unpack to more than is taken.',
  damaged: 'This archive was changed or damaged after it was exported.',
  'bad-file': 'A file of this archive does not say what it must.'
};

/** Why an archive was not imported, and whether to offer to import it all the same. */
export function refusalWords(refused: Extract<ImportArchive, { ok: false }>): {
  problem: string;
  before: boolean;
} {
  if (refused.reason === 'not-allowed')
    return { problem: 'You are no lead of this team any more.', before: false };
  if (refused.reason === 'imported-before') {
    const day = new Date(refused.at).toISOString().slice(0, 10);
    return {
      problem: `This very archive was imported into this team on ${day}. Nothing was imported now: it would all be here twice.`,
      before: true
    };
  }
  return { problem: `${BEGIN[refused.reason]} ${refused.what} Nothing was imported.`, before: false };
}
