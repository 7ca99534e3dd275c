import localFont from 'next/font/local';

// Latin only, used weights only. Only the two faces that every page shows first are preloaded.

export const textFont = localFont({
  src: [
    {
      path: '../../node_modules/@fontsource/atkinson-hyperlegible-next/files/atkinson-hyperlegible-next-latin-400-normal.woff2',
      weight: '400',
    },
    {
      path: '../../node_modules/@fontsource/atkinson-hyperlegible-next/files/atkinson-hyperlegible-next-latin-600-normal.woff2',
      weight: '600',
    },
    {
      path: '../../node_modules/@fontsource/atkinson-hyperlegible-next/files/atkinson-hyperlegible-next-latin-700-normal.woff2',
      weight: '700',
    },
  ],
  variable: '--font-hyperlegible',
  display: 'swap',
  preload: false,
});

export const codeFont = localFont({
  src: [
    {
      path: '../../node_modules/@fontsource/barlow-condensed/files/barlow-condensed-latin-600-normal.woff2',
      weight: '600',
    },
    {
      path: '../../node_modules/@fontsource/barlow-condensed/files/barlow-condensed-latin-700-normal.woff2',
      weight: '700',
    },
  ],
  variable: '--font-barlow',
  display: 'swap',
  fallback: ['Arial Narrow', 'Roboto Condensed'],
  preload: true,
});

export const readingFont = localFont({
  src: [
    {
      path: '../../node_modules/@fontsource/atkinson-hyperlegible-mono/files/atkinson-hyperlegible-mono-latin-400-normal.woff2',
      weight: '400',
    },
    {
      path: '../../node_modules/@fontsource/atkinson-hyperlegible-mono/files/atkinson-hyperlegible-mono-latin-700-normal.woff2',
      weight: '700',
    },
  ],
  variable: '--font-hyperlegible-mono',
  display: 'swap',
  adjustFontFallback: false,
  fallback: ['Liberation Mono', 'Menlo', 'Consolas'],
  preload: false,
});
