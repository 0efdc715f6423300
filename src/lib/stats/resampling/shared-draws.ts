import type { DrawHelper } from './draw-helper';
import type { DrawAnswer, FittedDraws, FittedJob } from './fitted-draws';

/** Milliseconds of drawing before a helper is asked, and that must be left: a thread takes 40 to start, and starts cold. */
const worthIt = 100;
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
    const passed = Date.now() - this.start;
    if (!this.helping) {
      this.helping = passed >= worthIt && passed * (1 - share) >= worthIt * share;
      if (!this.helping) return;
    }
    while (this.helper && this.lent < mostLent && this.next < this.end) {
      const usual = Math.round((rangeTime * this.made) / passed);
      const size = Math.max(1, Math.min(usual, Math.ceil((this.end - this.next) / 6)));
      this.send(this.helper, this.next, this.next + size, wanted);
      this.next += size;
    }
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
