import type { Config } from 'tailwindcss';
import { colours } from './components/ui/tokens';

const config: Config = {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  theme: {
    // The whole palette: nothing else on a page is green, orange or blue.
    colors: {
      inherit: 'inherit',
      current: 'currentColor',
      transparent: 'transparent',
      ...colours,
      // These follow the ground they stand on (globals.css, `ground-*`).
      ground: 'var(--ground)',
      fore: 'var(--fore)',
      'fore-quiet': 'var(--fore-quiet)',
      line: 'var(--line)',
      control: 'var(--control)',
    },
    fontFamily: {
      code: ['var(--font-barlow)', 'sans-serif'],
      text: ['var(--font-hyperlegible)', 'sans-serif'],
      reading: ['var(--font-hyperlegible-mono)', 'monospace'],
    },
    extend: {
      screens: { xs: '22.5rem' },
      maxWidth: { phone: '30rem', prose: '40rem' },
    },
  },
};

export default config;
