import { shownName } from '$lib/model/shown-name';
import { defaultMaxBytes } from '$lib/formats/limits';
import { isOtherText } from './is-other-text';
import type { Settings } from './settings';

export interface KeptFile {
  name: string;
  size: number;
  /** Null for a file over the limit, which is not loaded at all. */
  bytes: Uint8Array | null;
}

/** Where the text in the field came from, and the settings that belong to it. */
export interface Origin {
  name: string | null;
  text: string;
  settings: Partial<Settings>;
}

interface Kept {
  text: string;
  origin: Origin | null;
  file: KeptFile | null;
}

/** Files of up to so many bytes are shown in the field and can be edited there. */
export const EDITABLE = 64 * 1024;

/** The counts as they stand: text in the field, or a file too large or not plain enough to show there. */
export class CountsInput {
  text = $state('');
  /** File, example or address that the text came from; null when typed or pasted. */
  origin = $state.raw<Origin | null>(null);
  file = $state.raw<KeptFile | null>(null);
  /** What the last clearing or replacing took away. */
  removed = $state.raw<(Kept & { how: 'cleared' | 'replaced' }) | null>(null);

  /** What the last choice of files left out or could not take, in words. */
  notice = $state('');

  /** Name of the file, example or dataset; it says so when the text was edited since. */
  get name(): string | null {
    if (!this.origin?.name) return null;
    return this.file || this.text === this.origin.text ? this.origin.name : `${this.origin.name}, edited`;
  }

  get empty(): boolean {
    return !this.file && this.text.trim() === '';
  }

  /** What the reader gets; null for a file that was not loaded. */
  get content(): string | Uint8Array | null {
    return this.file ? this.file.bytes : this.text;
  }

  /** Typed or pasted text. @returns whether it is other counts than those that came with the name */
  edit(text: string): boolean {
    this.text = text;
    this.notice = '';
    const other = this.origin !== null && isOtherText(this.origin.text, text);
    if (other) this.origin = null;
    return other;
  }

  replace(text: string, name: string | null, settings: Partial<Settings> = {}): void {
    this.#keep('replaced');
    Object.assign(this, { text, origin: { name, text, settings }, file: null, notice: '' });
  }

  /**
   * Takes the first of these files; what stands there stays when that file is empty.
   * @param wanted false once something newer took the place of this choice
   * @returns whether there are other counts now
   */
  async take(files: File[], wanted: () => boolean): Promise<boolean> {
    const [file] = files;
    const name = shownName(file.name);
    let bytes: Uint8Array | null = null;
    try {
      if (file.size <= defaultMaxBytes) bytes = new Uint8Array(await file.arrayBuffer());
    } catch {
      // A folder, or a file that went away.
      if (wanted()) this.notice = `${name} could not be opened.`;
      return false;
    }
    if (!wanted()) return false;
    const text = bytes && bytes.length <= EDITABLE ? plainText(bytes) : null;
    if (text?.trim() === '') {
      this.notice = `${name} is empty.`;
      return false;
    }
    if (text !== null) this.replace(text, name);
    else {
      this.#keep('replaced');
      const origin: Origin = { name, text: '', settings: {} };
      Object.assign(this, { text: '', origin, file: { name, size: file.size, bytes } });
    }
    this.notice = files.length > 1 ? `Of ${files.length} files, ${name} was taken.` : '';
    return true;
  }

  clear(): void {
    this.#keep('cleared');
    Object.assign(this, { text: '', origin: null, file: null, notice: '' });
  }

  undo(): void {
    if (!this.removed) return;
    const { text, origin, file } = this.removed;
    Object.assign(this, { text, origin, file, removed: null, notice: '' });
  }

  #keep(how: 'cleared' | 'replaced'): void {
    const { text, origin, file } = this;
    this.removed = this.empty ? null : { text, origin, file, how };
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
