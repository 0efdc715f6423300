import type { Pen } from '../type/pen';
import { PAGE } from './geometry';
import type { Element } from './tags';

/** Something set in the margin, and how high it is. */
export interface MarginPiece {
  height: number;
  draw: (x: number, y: number) => void;
}

/** Points between two notes in the margin. */
export const NOTE_GAP = 9;

/** Where the next thing goes: a cursor down the main column and one down the margin, over as many pages as it takes. */
export class Flow {
  y: number = PAGE.top;
  private marginY: number = PAGE.top;
  private waiting: MarginPiece[] = [];
  private pageCount = 0;

  constructor(
    readonly pen: Pen,
    readonly root: Element,
    private readonly onPage: () => void
  ) {
    this.newPage();
  }

  get doc(): PDFKit.PDFDocument {
    return this.pen.doc;
  }

  /** Number of the page in hand, from 1. */
  get pageNumber(): number {
    return this.pageCount;
  }

  /** Points left on this page. */
  get room(): number {
    return PAGE.bottom - this.y;
  }

  get atTop(): boolean {
    return this.y === PAGE.top;
  }

  newPage(): void {
    this.doc.addPage();
    this.pageCount++;
    this.onPage();
    this.y = PAGE.top;
    this.marginY = PAGE.top;
    const waiting = this.waiting;
    this.waiting = [];
    for (const piece of waiting) this.putInMargin(piece);
  }

  /** Goes to a new page unless `height` points are left. */
  need(height: number): void {
    if (this.room < height && !this.atTop) this.newPage();
  }

  /** Moves down, but leaves no gap at the top of a page. */
  skip(height: number): void {
    if (!this.atTop) this.y += height;
  }

  /**
   * Sets a margin note level with the cursor, or below the note before it; on the next page where it does not fit. At
   * the top of a page it is set whatever its height: no later page has more room, and it would wait for ever.
   */
  putInMargin(piece: MarginPiece): void {
    const y = Math.max(this.y, this.marginY);
    const fits = y + piece.height <= PAGE.bottom + 6 || y === PAGE.top;
    if (this.waiting.length > 0 || !fits) {
      this.waiting.push(piece);
      return;
    }
    piece.draw(PAGE.note, y);
    this.marginY = y + piece.height + NOTE_GAP;
  }

  /** Moves the cursor below the notes, for something that is as wide as both columns. */
  clearMargin(): void {
    this.y = Math.max(this.y, this.marginY);
  }

  /** Sets the notes that still wait. */
  finish(): void {
    while (this.waiting.length > 0) this.newPage();
  }
}
