import type { Metadata } from 'next';
import localFont from 'next/font/local';
import type { ReactNode } from 'react';
import { interfaceTexts } from '@/lib/texts/interface-texts';
import './globals.css';

// Both faces sit 1766 above and 766 below the line on 2000 units, with capitals of 1400: words would stand a tenth
// of an em too high in a button. The overrides keep the sum and put the middle between capitals and small letters.
// They stand twice because the font loader takes literals only.
const words = localFont({
  src: '../fonts/overpass-latin-variable.woff2',
  weight: '100 900',
  style: 'normal',
  display: 'swap',
  variable: '--font-words',
  declarations: [
    { prop: 'ascent-override', value: '95.3%' },
    { prop: 'descent-override', value: '31.3%' },
    { prop: 'line-gap-override', value: '0%' },
  ],
});

const numbers = localFont({
  src: '../fonts/overpass-mono-latin-variable.woff2',
  weight: '300 700',
  style: 'normal',
  display: 'swap',
  variable: '--font-numbers',
  adjustFontFallback: false,
  fallback: ['ui-monospace', 'monospace'],
  declarations: [
    { prop: 'ascent-override', value: '95.3%' },
    { prop: 'descent-override', value: '31.3%' },
    { prop: 'line-gap-override', value: '0%' },
  ],
});

export const metadata: Metadata = {
  title: { default: interfaceTexts.product.name, template: `%s, ${interfaceTexts.product.name}` },
  description: interfaceTexts.product.description,
  robots: { index: false, follow: false },
};

// Spread, because the script must run before the first paint: neither deferred nor asynchronous, on purpose.
const themeScript = { src: '/theme.js' };

/** The outermost page. It reads no cookie and no header, so that a page below it can still be made ahead of time. */
export default function RootLayout({ children }: { children: ReactNode }) {
  return (
    // The theme script sets data-theme before React looks, so that the attribute differs from the server's markup.
    <html lang="en-US" className={`${words.variable} ${numbers.variable}`} suppressHydrationWarning>
      <head>
        <script {...themeScript} />
      </head>
      <body>{children}</body>
    </html>
  );
}
