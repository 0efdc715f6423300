/**
 * A text as one cell of a CSV file. A cell that a spreadsheet would take for a formula gets an apostrophe in front,
 * which spreadsheets do not show: = + - @ and the signs that they skip before looking (tab, line ends).
 */
export function csvCell(text: string): string {
  const plain = /^\s*[=+\-@\t\r\n＝＋－＠]/.test(text) ? `'${text}` : text;
  return /[",\r\n;#]|^\s|\s$/.test(plain) ? `"${plain.replaceAll('"', '""')}"` : plain;
}
