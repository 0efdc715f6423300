import type { Ink } from './picture';

/** The day inks of app.css, for files that leave the page. */
export const DOWNLOAD_INKS: Record<Ink, string> = {
  ink: '#1f1b16',
  faint: '#5d5546',
  line: '#857a66',
  hair: '#cdc3ae',
  oxide: '#9a2f1c',
  verdigris: '#1d6656',
  brass: '#795600',
  paper: '#ffffff',
  none: 'none'
};

export const FACES = {
  text: { family: "'Atkinson Hyperlegible', Verdana, sans-serif", weight: 400 },
  bold: { family: "'Atkinson Hyperlegible', Verdana, sans-serif", weight: 700 },
  number: { family: "'Atkinson Hyperlegible Mono', 'DejaVu Sans Mono', monospace", weight: 400 }
} as const;
