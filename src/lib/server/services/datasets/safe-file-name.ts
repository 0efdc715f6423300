/**
 * A file name that no system minds and no header breaks on: no folders, control signs, quotes or reserved signs, at
 * most 120 characters, the ending kept. Letters of any script stay.
 */
export function safeFileName(name: string, fallback = 'counts'): string {
  const bare = (name.split(/[/\\]/).pop() ?? '')
    .normalize('NFC')
    // Controls, reserved signs, and marks that turn the direction of writing ("txt.exe" shown as "exe.txt").
    .replace(/[\p{Cc}\p{Cf}\p{Cs}<>:"|?*%;]/gu, '')
    .replace(/\s+/g, ' ')
    .replace(/^[.\s]+|[.\s]+$/g, '');
  const ending = /\.[A-Za-z0-9]{1,8}$/.exec(bare)?.[0] ?? '';
  const body = [...bare.slice(0, bare.length - ending.length)].slice(0, 120 - ending.length).join('');
  const safe = /^(con|prn|aux|nul|com\d|lpt\d)$/i.test(body) ? `_${body}` : body;
  return (safe || fallback) + ending;
}
