export interface GivenFile {
  name: string;
  bytes: Uint8Array;
}

/** The files that a form carries, and what was pasted into it. */
export async function filesOfForm(data: FormData): Promise<GivenFile[]> {
  const files: GivenFile[] = [];
  for (const file of data.getAll('files')) {
    if (typeof file !== 'string' && file.name !== '')
      files.push({ name: file.name, bytes: new Uint8Array(await file.arrayBuffer()) });
  }
  const pasted = String(data.get('pasted') ?? '');
  if (pasted.trim() !== '') files.push({ name: 'pasted.txt', bytes: new TextEncoder().encode(pasted) });
  return files;
}
