/** The inks of app.css and of the downloads. */
export type Ink = 'ink' | 'faint' | 'line' | 'hair' | 'oxide' | 'verdigris' | 'brass' | 'paper' | 'none';

/** What a drawn thing stands for. One role looks the same in every chart; ink-of-role.ts says how. */
export type Role =
  | 'observed'
  | 'observed-more'
  | 'observed-fewer'
  | 'observed-unsure'
  | 'interval'
  | 'interval-more'
  | 'interval-fewer'
  | 'interval-unsure'
  | 'range'
  | 'range-more'
  | 'range-fewer'
  | 'unseen'
  | 'fitted'
  | 'law'
  | 'corner'
  | 'limit'
  | 'gaussian'
  | 'mean-bound'
  | 'bound'
  | 'hatch'
  | 'horizon'
  | 'smallest'
  | 'shade'
  | 'axis'
  | 'grid'
  | 'level';

export interface PathMark {
  kind: 'path';
  role: Role;
  d: string;
}

export interface TextMark {
  kind: 'text';
  x: number;
  y: number;
  text: string;
  /** Small raised digits after the text, as in 10⁻³. */
  raised?: string;
  anchor: 'start' | 'middle' | 'end';
  ink: Ink;
  face: 'text' | 'number' | 'bold';
  size: number;
  /** Paper around the letters, where lines may pass behind them. */
  halo?: boolean;
}

export type Mark = PathMark | TextMark;

/** One thing that can be pointed at or walked to, and what it says. */
export interface Reading {
  x: number;
  y: number;
  /** Made when it is asked for: of 10 000 counts a person hears a few. */
  words: () => string;
}

export interface LegendEntry {
  role: Role;
  label: string;
  /** Where a limit points down in this picture; an arrow goes up otherwise. */
  down?: boolean;
  /** A point that has no interval in this picture. */
  bare?: true;
}

/** How the height of a picture follows from its width and letters: the page keeps that room free (Drawing.svelte). */
export type Build = 'field' | 'low-field' | 'field-and-strip' | 'lines';

/** A chart as plain geometry: page, SVG, PNG and PDF draw the same marks. */
export interface Picture {
  width: number;
  height: number;
  build: Build;
  marks: Mark[];
  legend: LegendEntry[];
  readings: Reading[];
  /** Which way the readings follow one another: by their count, or line under line; or all over, as on a map. */
  order: 'across' | 'down' | 'all-over';
  /** What the drawing leaves out or gathers together, in words. */
  notes: string[];
}

/** Rectangle inside the axes, in picture units. */
export interface Frame {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

export type Point = [number, number];

/** Room a picture may take: its width and the height of its letters, picture units. */
export interface Size {
  width: number;
  text: number;
}

/** One mark on an axis. */
export interface Tick {
  at: number;
  text: string;
  raised?: string;
}
