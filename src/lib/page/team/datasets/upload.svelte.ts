import { shownName } from '$lib/model/shown-name';
import type { ConditionName } from '$lib/model/team/datasets/conditions';
import type { NamedDataset, Preview } from '$lib/model/team/datasets/preview';
import type { ReadingChoices } from '$lib/model/team/datasets/reading-choices';
import { readTypedConditions, type ConditionProblems } from '$lib/model/team/datasets/read-typed-conditions';
import type { SaveRequest } from '$lib/model/team/datasets/save-request';
import type { Reading } from '$lib/formats/types';
import { draftsOf, type Draft } from './drafts';
import { fetchJson, Refused } from './fetch-json';

/** A file on its way into the team. */
export interface UploadFile {
  key: number;
  name: string;
  status: 'sending' | 'read' | 'refused';
  /** Why it was refused. */
  message: string;
  preview: Preview<Reading> | null;
  /** Save again what is there already. */
  again: boolean;
  drafts: Draft[];
}

interface Trouble {
  fileId: string;
  index: number;
  problems: ConditionProblems;
}

/** Largest file that the server takes. */
const MOST_BYTES = 20 * 1024 * 1024;

/** Files chosen, what was read in them, and what was typed beside: nothing is saved before `save`. */
export class Upload {
  files = $state<UploadFile[]>([]);
  saving = $state(false);
  message = $state('');
  /** Datasets that are there already, after a save was refused for them. */
  already = $state.raw<NamedDataset[]>([]);
  #next = 0;

  constructor(readonly root: string) {}

  /** Takes up what a form without JavaScript had come to. */
  resume(previews: Preview<Reading>[], drafts: Draft[][] = []): void {
    for (const [i, preview] of previews.entries()) {
      const { name } = preview.file;
      const base = { key: this.#next++, name, message: '', again: false };
      this.files.push({ ...base, status: 'read', preview, drafts: drafts[i] ?? draftsOf(preview) });
    }
  }

  get kept(): number {
    return this.files.reduce((sum, { drafts }) => sum + drafts.filter(({ keep }) => keep).length, 0);
  }

  /** Sends files one after the other, so that a failure costs one file and not all. */
  async add(files: File[]): Promise<void> {
    const entries = files.map((file) => {
      const base = {
        key: this.#next++,
        name: shownName(file.name),
        message: '',
        preview: null,
        again: false,
        drafts: []
      };
      this.files.push({ ...base, status: 'sending' });
      return { file, entry: this.files[this.files.length - 1] };
    });
    for (const { file, entry } of entries) await this.#send(entry, file);
  }

  remove(key: number): void {
    this.files = this.files.filter((file) => file.key !== key);
  }

  async read(entry: UploadFile, choices: ReadingChoices): Promise<void> {
    if (!entry.preview) return;
    const body = JSON.stringify({ fileId: entry.preview.file.id, choices });
    await this.#preview(entry, { body, headers: { 'content-type': 'application/json' } });
  }

  setForAll(name: ConditionName, value: string): void {
    for (const { drafts } of this.files)
      for (const draft of drafts) {
        draft.typed[name] = value;
        delete draft.problems[name];
      }
  }

  /** Saves what is marked. @returns the datasets, or null when something stands in the way */
  async save(): Promise<NamedDataset[] | null> {
    this.message = '';
    this.already = [];
    const request = this.#request();
    if (!request) return null;
    this.saving = true;
    try {
      const answer = await fetchJson<{ saved: NamedDataset[] }>(`${this.root}/save`, {
        method: 'POST',
        headers: { 'content-type': 'application/json' },
        body: JSON.stringify(request)
      });
      return answer.saved;
    } catch (error) {
      if (!(error instanceof Refused)) throw error;
      this.message = error.message;
      if (error.code === 'already-there') this.already = (error.body.already ?? []) as NamedDataset[];
      if (error.code === 'bad-conditions') this.#show((error.body.troubles ?? []) as Trouble[]);
      return null;
    } finally {
      this.saving = false;
    }
  }

  #request(): SaveRequest | null {
    let wrong = 0;
    const files = this.files.flatMap(({ preview, again, drafts }): SaveRequest['files'] => {
      const datasets = drafts.flatMap((draft) => {
        if (!draft.keep) return [];
        const read = readTypedConditions(draft.typed);
        draft.problems = read.ok ? {} : read.problems;
        if (!read.ok) wrong++;
        return read.ok ? [{ index: draft.index, conditions: read.conditions }] : [];
      });
      if (!preview || datasets.length === 0) return [];
      return [{ fileId: preview.file.id, choices: preview.choices, again, datasets }];
    });
    if (wrong > 0) this.message = 'Some conditions do not fit: they are marked.';
    else if (files.length === 0) this.message = 'No dataset is marked to be saved.';
    return wrong === 0 && files.length > 0 ? { files } : null;
  }

  #show(troubles: Trouble[]): void {
    for (const { fileId, index, problems } of troubles) {
      const file = this.files.find(({ preview }) => preview?.file.id === fileId);
      const draft = file?.drafts.find((one) => one.index === index);
      if (draft) draft.problems = problems;
    }
  }

  async #send(entry: UploadFile, file: File): Promise<void> {
    if (file.size > MOST_BYTES) {
      entry.status = 'refused';
      entry.message = `It has ${Math.ceil(file.size / 104857.6) / 10} MB; the limit is 20 MB.`;
      return;
    }
    const body = new FormData();
    body.set('file', file);
    await this.#preview(entry, { body });
  }

  async #preview(entry: UploadFile, init: RequestInit): Promise<void> {
    const before = entry.preview;
    entry.status = 'sending';
    entry.message = '';
    try {
      const preview = await fetchJson<Preview<Reading>>(`${this.root}/preview`, { method: 'POST', ...init });
      const drafts = draftsOf(preview, entry.drafts);
      Object.assign(entry, { preview, drafts, status: 'read' });
    } catch (error) {
      if (!(error instanceof Refused)) throw error;
      Object.assign(entry, { status: before ? 'read' : 'refused', message: error.message });
    }
  }
}
