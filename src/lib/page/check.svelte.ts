import type { ReadOptions, ReadResult, Suggested } from '$lib/formats/types';
import type { CountData, DiagnoseOptions } from '$lib/stats/types';
import { writeAddress } from './address';
import { addressWords } from './address-words';
import { CountsInput } from './counts-input.svelte';
import { experimentSettings } from './experiment-settings';
import { readAddress } from './read-address';
import { Reader } from './reader';
import { readSettings, readTrials, type SettingProblems } from './read-settings';
import type { Result, Running } from './result-types';
import { startRun, type Run } from './runner';
import { freshSettings, type SettingName, type Settings } from './settings';
import { settingsWith } from './settings-with';
import { textOfData } from './text-of-data';
import { tooLarge } from './too-large';

export type { Result, Running };

const PAUSE = 250;

/** All that the page knows: what was given, how it was read, what runs, and what came out. */
export class Check {
  readonly input = new CountsInput();
  settings = $state<Settings>(freshSettings());
  readOptions = $state.raw<ReadOptions>({});
  read = $state.raw<ReadResult | null>(null);
  dataset = $state(0);
  settingProblems = $state.raw<SettingProblems>({});
  /** Why the engine would not or could not answer. */
  refusal = $state('');
  /** What is wrong with the address that was opened, or what it leaves to the person. */
  addressProblem = $state('');
  running = $state.raw<Running | null>(null);
  result = $state.raw<Result | null>(null);
  /** The input has changed since the result was computed. */
  stale = $state(false);

  readonly #reader = new Reader();
  #touched: Partial<Record<SettingName, true>> = {};
  #run: Run | null = null;
  #turn = 0;
  #timer: ReturnType<typeof setTimeout> | undefined;

  /** Begins something slow that brings counts. @returns a function: is it still the newest? */
  turn(): () => boolean {
    const mine = ++this.#turn;
    return () => mine === this.#turn;
  }

  /** The counts changed: whatever was said about how to read the former ones no longer holds. */
  countsChanged(fresh: boolean): void {
    this.#turn++;
    if (fresh) {
      this.readOptions = {};
      this.dataset = 0;
      this.#settle({});
    }
    this.#changed(fresh ? 0 : PAUSE);
  }

  setReadOptions(options: ReadOptions): void {
    this.readOptions = { ...this.readOptions, ...options };
    this.#changed(0);
  }

  setSetting<Name extends SettingName>(name: Name, value: Settings[Name]): void {
    this.settings[name] = value;
    this.addressProblem = '';
    this.#touched[name] = true;
    this.settingProblems = { ...this.settingProblems, [name]: undefined };
    if (name === 'trials') this.#changed(PAUSE);
    else this.stale = this.result !== null;
  }

  setDataset(index: number): void {
    this.dataset = index;
    this.#suggest();
    this.stale = this.result !== null;
  }

  /** Counts of an example, with what belongs to them of the experiment; how hard to look stays as it is set. */
  takeExample(text: string, name: string, options: Partial<DiagnoseOptions>): void {
    const stated = experimentSettings(settingsWith(freshSettings(), options));
    this.input.replace(text, name, stated);
    for (const setting of Object.keys(stated) as SettingName[]) delete this.#touched[setting];
    this.countsChanged(true);
  }

  /** Leaves the result and whatever is on its way to one. */
  leave(): void {
    this.#turn++;
    this.cancel();
    this.result = null;
    this.stale = false;
    this.refusal = '';
    this.addressProblem = '';
  }

  /** Opens what an address carries, and checks it when it is whole. @returns false when something newer took over */
  async open(fragment: string): Promise<boolean> {
    this.leave();
    const read = readAddress(fragment);
    if (!read.ok) {
      this.addressProblem = read.problem;
      return true;
    }
    const { data, settings, name, whole } = read.address;
    this.#touched = {};
    this.input.replace(textOfData(data), name, settings);
    this.countsChanged(true);
    const wanted = this.turn();
    if (whole) await this.start();
    else await this.#ready();
    if (!wanted()) return false;
    this.addressProblem = addressWords(this.read, this.settingProblems, this.refusal, whole);
    return true;
  }

  /** Checks the counts. @returns the result, or null when something stood in the way or it was cancelled */
  async start(): Promise<Result | null> {
    this.cancel();
    clearTimeout(this.#timer);
    this.refusal = '';
    this.addressProblem = '';
    const options = await this.#ready();
    if (!this.read?.ok || !options) return null;
    const { data, name } = this.read.datasets[this.dataset] ?? this.read.datasets[0];
    const whole = this.input.name;
    const label = this.read.datasets.length > 1 ? (whole ? `${name} of ${whole}` : name) : whole;
    return this.#diagnose(data, options, label);
  }

  /** Reads counts and fields. @returns the options, or null when a field is wrong */
  async #ready(): Promise<DiagnoseOptions | null> {
    await this.#readNow();
    const settings = await readSettings($state.snapshot(this.settings));
    this.settingProblems = settings.ok ? {} : settings.problems;
    return settings.ok ? settings.options : null;
  }

  async #diagnose(data: CountData, options: DiagnoseOptions, name: string | null): Promise<Result | null> {
    const since = performance.now();
    this.running = { share: 0, step: 'fit', since };
    const run = startRun(data, options, (progress) => {
      if (this.#run === run) this.running = { ...progress, since };
    });
    this.#run = run;
    const outcome = await run.result;
    if (this.#run !== run) return null;
    this.#run = null;
    this.running = null;
    if (!outcome.ok) {
      if (outcome.reason !== 'cancelled') this.refusal = outcome.message;
      return null;
    }
    const address = writeAddress(data, options, name);
    this.stale = false;
    this.result = { diagnosis: outcome.diagnosis, data, options, name, address };
    return this.result;
  }

  cancel(): void {
    this.#run?.cancel();
    this.#run = null;
    this.running = null;
  }

  close(): void {
    this.cancel();
    clearTimeout(this.#timer);
    this.#reader.close();
  }

  #changed(wait: number): void {
    this.stale = this.result !== null;
    this.refusal = '';
    this.addressProblem = '';
    clearTimeout(this.#timer);
    this.#timer = setTimeout(() => void this.#readNow(), wait);
  }

  async #readNow(): Promise<void> {
    const { content, file, empty, name } = this.input;
    if (empty) {
      this.read = null;
    } else if (content === null) {
      this.read = tooLarge(file?.size ?? 0);
    } else {
      const known = this.#touched.trials || this.input.origin?.settings.trials !== undefined;
      const trials = known ? readTrials(this.settings.trials) : undefined;
      const options: ReadOptions = { ...this.readOptions };
      if (trials !== undefined) options.trials = trials;
      if (name) options.name = name;
      const result = await this.#reader.read(content, options);
      if (result === 'failed')
        this.refusal =
          'The part that reads counts could not be loaded. Reload the page: an example or an address opens again.';
      else if (result !== 'superseded') {
        this.read = result;
        this.#suggest();
      }
    }
  }

  /** Options that the file itself states fill the fields that nobody has touched. */
  #suggest(): void {
    if (!this.read?.ok) return;
    if (this.dataset >= this.read.datasets.length) this.dataset = 0;
    this.#settle(this.read.datasets[this.dataset].suggested);
  }

  /** Fields that nobody has touched: as the counts state them, as they came with the counts, or as on a fresh page. */
  #settle(suggested: Suggested): void {
    const settings = settingsWith({ ...freshSettings(), ...this.input.origin?.settings }, suggested);
    const touched = Object.keys(this.#touched).map((name) => [name, this.settings[name as SettingName]]);
    this.settings = { ...settings, ...Object.fromEntries(touched) };
  }
}
