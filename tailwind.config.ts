import type { Config } from 'tailwindcss';

/**
 * The tokens of the page. Colours are custom properties that app.css sets for day and night;
 * oxide, verdigris and brass keep one meaning each: more than independent trials allow, fewer, cannot tell.
 */
export default {
  content: ['./src/**/*.{html,svelte,ts}'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      paper: 'var(--paper)',
      sheet: 'var(--sheet)',
      ink: 'var(--ink)',
      faint: 'var(--faint)',
      line: 'var(--line)',
      hair: 'var(--hair)',
      oxide: 'var(--oxide)',
      verdigris: 'var(--verdigris)',
      brass: 'var(--brass)'
    },
    fontFamily: {
      text: ['"Atkinson Hyperlegible"', 'Verdana', 'sans-serif'],
      number: ['"Atkinson Hyperlegible Mono"', '"DejaVu Sans Mono"', 'monospace']
    },
    fontSize: {
      note: ['0.875rem', '1.45'],
      body: ['1rem', '1.6'],
      lead: ['1.1875rem', '1.5'],
      section: ['1.375rem', '1.3'],
      answer: ['clamp(1.5rem, 1.1rem + 1.6vw, 2.125rem)', '1.25'],
      title: ['clamp(1.75rem, 1.3rem + 1.8vw, 2.5rem)', '1.15']
    },
    screens: { wide: '64rem', vast: '100rem' }
  }
} satisfies Config;
