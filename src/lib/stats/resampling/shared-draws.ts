import type { DrawHelper } from './draw-helper';
import { divergencesKept, type DrawAnswer, type FittedDraws, type FittedJob } from './fitted-draws';

/**
 * Milliseconds that must be left for help to be worth it: a thread takes 40 to start, and 400 to run its code
 * warm. How much is left shows once the first draws, which are refitted whole, are over and `trial` have passed with
 * others (while the code is cold they look two to three times as long); where the first draws alone take `long`, later
 * ones are taken to cost a quarter of them.
 */
const worthIt = 600;
const trial = 60;
const long = 250;
/** Milliseconds that a range is meant to take, and ranges lent at a time: together longer than between two turns. */
const rangeTime = 25;
const mostLent = 3;
/** Milliseconds between turns of the event loop while an answer from the helper is awaited. */
const listening = 15;

/**
 * Answers of draws, in order, some of which a helper gives. A draw depends on the job and its number alone, so it does
 * not matter who answers it, or whether both do.
 *
 * The helper is lent ranges ahead of where the asking is. While the next answer is still with it, draws that nobody has
 * are made here, and then, from the last backward, those it has not answered yet: a helper that is slow, dead or gone
 * costs nothing but the work that was lent.
 */
export class SharedDraws {
  /** Draws from here on are nobody's yet. */
  private next = 0;
  private readonly known = new Map<number, DrawAnswer>();
  private helping = false;
  private lent = 0;
  private made = 0;
  private readonly start = Date.now();
  private turned = this.start;
  /** The first draw that is not refitted whole, and when it came. */
  private later: { from: number; since: number } | null = null;

  /** @param end number of draws at most */
  constructor(
    private readonly draws: FittedDraws,
    private readonly job: FittedJob,
    private readonly end: number,
    private helper?: DrawHelper
  ) {}

  /**
   * Answer of draw b; ask for 0, 1, 2 … in turn.
   *
   * @param share how much of the whole is done, for whether help is still worth it
   * @param breathe called between the draws made while waiting; it may reject
   */
  async answer(b: number, wanted: number, share: number, breathe: () => Promise<void>): Promise<DrawAnswer> {
    for (;;) {
      this.lend(wanted, share);
      const known = this.known.get(b);
      if (known) {
        this.known.delete(b);
        return known;
      }
      if (b >= this.next) {
        this.next = b + 1;
        return this.make(b, wanted);
      }
      const other = this.helper ? this.meanwhile(b) : b;
      this.known.set(other, this.make(other, wanted));
      await this.listen();
      await breathe();
    }
  }

  private make(b: number, wanted: number): DrawAnswer {
    this.made++;
    return this.draws.draw(b, wanted);
  }

  private meanwhile(b: number): number {
    if (this.next < this.end) return this.next++;
    let last = this.next - 1;
    while (last > b && this.known.has(last)) last--;
    return last;
  }

  private lend(wanted: number, share: number): void {
    if (!this.helper || this.lent >= mostLent || this.next >= this.end) return;
    this.helping ||= this.left(share) >= worthIt;
    if (!this.helping) return;
    const passed = Date.now() - this.start;
    while (this.helper && this.lent < mostLent && this.next < this.end) {
      const usual = Math.round((rangeTime * this.made) / passed);
      const size = Math.max(1, Math.min(usual, Math.ceil((this.end - this.next) / 6)));
      this.send(this.helper, this.next, this.next + size, wanted);
      this.next += size;
    }
  }

  /** Milliseconds that the rest will take alone; 0 while nobody knows. */
  private left(share: number): number {
    const now = Date.now();
    // So many draws are left at the present share; fewer than to the end where a test is about to stop.
    const draws = share > 0 ? (this.next * (1 - share)) / share : 0;
    if (this.next < divergencesKept) {
      const passed = now - this.start;
      return passed >= long ? ((passed / this.next) * draws) / 4 : 0;
    }
    this.later ??= { from: this.next, since: now };
    const passed = now - this.later.since;
    return passed >= trial ? (passed / (this.next - this.later.from)) * draws : 0;
  }

  private send(helper: DrawHelper, from: number, to: number, wanted: number): void {
    this.lent++;
    // Inside a promise, so that what a helper throws at once is a rejection too.
    new Promise<DrawAnswer[]>((resolve) => resolve(helper.answers(this.job, { from, to, wanted })))
      .then((answers) => {
        this.lent--;
        if (answers.length !== to - from) throw new RangeError('not the answers asked for');
        answers.forEach((answer, i) => this.known.set(from + i, answer));
      })
      .catch(() => (this.helper = undefined));
  }

  private async listen(): Promise<void> {
    if (Date.now() - this.turned < listening) return;
    await new Promise((resolve) => setTimeout(resolve, 0));
    this.turned = Date.now();
  }
}
