import type { Metadata, Viewport } from 'next';
import type { ReactNode } from 'react';
import { codeFont, readingFont, textFont } from './fonts';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Pullpost', template: '%s · Pullpost' },
  description: 'A walk-up torque tool check: join the line, watch the readings, keep the record.',
  // Ticket, record and history addresses are secrets.
  robots: { index: false, follow: false },
  formatDetection: { telephone: false, address: false, email: false },
  icons: {
    icon: { url: '/favicon.svg', type: 'image/svg+xml' },
    apple: '/apple-touch-icon.png',
  },
};

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  themeColor: '#faf6ec',
};

export default function RootLayout({ children }: { children: ReactNode }) {
  return (
    <html
      lang="en-GB"
      className={`${codeFont.variable} ${textFont.variable} ${readingFont.variable}`}
    >
      <body className="ground-chalk">{children}</body>
    </html>
  );
}
