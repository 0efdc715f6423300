import { defaultMaxBytes } from '$lib/formats/limits';

export interface KeptFile {
  name: string;
  size: number;
  /** Null for a file over the limit, which is not loaded at all. */
  bytes: Uint8Array | null;
}

interface Kept {
  text: string;
  name: string | null;
  file: KeptFile | null;
}

/** Files up to this size are shown in the field and can be edited there. */
const EDITABLE = 64 * 1024;

/** The counts as they stand: text in the field, or a file too large or too odd to show there. */
export class CountsInput {
  text = $state('');
  /** File or example that the text came from; null when typed or pasted. */
  name = $state<string | null>(null);
  file = $state.raw<KeptFile | null>(null);
  /** What the last clearing or replacing took away. */
  removed = $state.raw<(Kept & { how: 'cleared' | 'replaced' }) | null>(null);

  get empty(): boolean {
    return !this.file && this.text.trim() === '';
  }

  /** What the reader gets; null for a file that was not loaded. */
  get content(): string | Uint8Array | null {
    return this.file ? this.file.bytes : this.text;
  }

  edit(text: string): void {
    this.text = text;
    if (text === '') this.name = null;
  }

  replace(text: string, name: string | null): void {
    this.#keep('replaced');
    Object.assign(this, { text, name, file: null });
  }

  async take(file: File): Promise<void> {
    const bytes = file.size > defaultMaxBytes ? null : new Uint8Array(await file.arrayBuffer());
    const text = bytes && bytes.length <= EDITABLE ? plainText(bytes) : null;
    if (text !== null) return this.replace(text, file.name);
    this.#keep('replaced');
    Object.assign(this, { text: '', name: file.name, file: { name: file.name, size: file.size, bytes } });
  }

  clear(): void {
    this.#keep('cleared');
    Object.assign(this, { text: '', name: null, file: null });
  }

  undo(): void {
    if (!this.removed) return;
    const { text, name, file } = this.removed;
    Object.assign(this, { text, name, file, removed: null });
  }

  #keep(how: 'cleared' | 'replaced'): void {
    const { text, name, file } = this;
    this.removed = this.empty ? null : { text, name, file, how };
  }
}

/** Null unless the bytes are UTF-8 text without control signs: anything else goes to the reader as it is. */
function plainText(bytes: Uint8Array): string | null {
  try {
    const text = new TextDecoder('utf-8', { fatal: true }).decode(bytes);
    return /[\0-\x08\x0e-\x1f]/.test(text) ? null : text;
  } catch {
    return null;
  }
}
