import type { Config } from 'tailwindcss';

/** Named by meaning; the values live in src/index.css, where light and dark differ. */
const tokens = [
  'ink', 'ink-2', 'ink-3',
  'paper', 'surface', 'sunk',
  'rule', 'edge',
  'fjord', 'fjord-2', 'fjord-tint',
  'ice', 'ice-2', 'ice-3',
  'kelp',
  'ember', 'ember-tint',
  'rust', 'rust-tint',
  'straw', 'straw-tint',
  'on',
];

const colors = Object.fromEntries(tokens.map((token) => [token, `var(--${token})`]));

export default {
  content: ['./index.html', './src/**/*.{ts,tsx}'],
  theme: {
    colors: { ...colors, transparent: 'transparent', current: 'currentColor' },
    fontFamily: { sans: ['"Noto Sans"', 'system-ui', 'sans-serif'] },
    fontSize: {
      display: ['1.875rem', { lineHeight: '1.15', letterSpacing: '-0.022em' }],
      title: ['1.5625rem', { lineHeight: '1.2', letterSpacing: '-0.02em' }],
      lead: ['1.0625rem', { lineHeight: '1.35', letterSpacing: '-0.01em' }],
      base: ['0.9375rem', { lineHeight: '1.45' }],
      body: ['0.875rem', { lineHeight: '1.45' }],
      small: ['0.78125rem', { lineHeight: '1.45' }],
    },
    borderRadius: { none: '0', tag: '4px', control: '6px', card: '10px', full: '9999px' },
  },
} satisfies Config;
