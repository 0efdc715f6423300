const text = (letters: string) => Array.from(letters, (letter) => letter.charCodeAt(0));

const workbook = 'Open it in the spreadsheet program and save the sheet as CSV.';
const unpack = 'Unpack it and give the file inside.';
const table = 'Save the counts as CSV: one row for each count, with the number of shots.';

/** First bytes of files that people drop by mistake. Public file signatures. */
const signatures: { bytes: number[]; name: string; fix: string }[] = [
  { bytes: text('PK\u0003\u0004'), name: 'a zip archive or an Excel or LibreOffice workbook', fix: workbook },
  { bytes: [0xd0, 0xcf, 0x11, 0xe0], name: 'an old Excel or Word file', fix: workbook },
  { bytes: text('%PDF-'), name: 'a PDF', fix: 'Copy the table out of it and paste the cells.' },
  {
    bytes: [0x89, ...text('PNG')],
    name: 'a PNG picture',
    fix: 'Type the counts, or ask for the table behind it.'
  },
  {
    bytes: [0xff, 0xd8, 0xff],
    name: 'a JPEG picture',
    fix: 'Type the counts, or ask for the table behind it.'
  },
  { bytes: text('GIF8'), name: 'a GIF picture', fix: 'Type the counts, or ask for the table behind it.' },
  { bytes: [0x1f, 0x8b], name: 'a gzip archive', fix: unpack },
  { bytes: text('BZh9'), name: 'a bzip2 archive', fix: unpack },
  { bytes: [0xfd, ...text('7zXZ')], name: 'an xz archive', fix: unpack },
  { bytes: text('7z\u00bc\u00af'), name: 'a 7z archive', fix: unpack },
  { bytes: text('Rar!'), name: 'a RAR archive', fix: unpack },
  { bytes: [0x89, ...text('HDF')], name: 'an HDF5 file', fix: table },
  {
    bytes: [0x93, ...text('NUMPY')],
    name: 'a NumPy array',
    fix: 'Write it with numpy.savetxt(…, fmt="%d").'
  },
  { bytes: text('MATLAB 5.0'), name: 'a MATLAB file', fix: table },
  { bytes: text('SQLite format 3'), name: 'an SQLite database', fix: table },
  { bytes: [...text('PAR1'), 0x15], name: 'a Parquet file', fix: table },
  { bytes: text('{\\rtf'), name: 'a rich-text document', fix: 'Save it as plain text or CSV.' }
];

/**
 * Names the kind of a file that is certainly no text of counts, by its first bytes.
 *
 * @returns its name with an article and what to do with it, or null when nothing is recognised.
 */
export function recogniseBinary(bytes: Uint8Array): { name: string; fix: string } | null {
  for (const { bytes: start, name, fix } of signatures) {
    if (start.every((byte, index) => bytes[index] === byte)) return { name, fix };
  }
  return null;
}
