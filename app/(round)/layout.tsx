import type { Metadata, Viewport } from 'next';
import type { ReactNode } from 'react';
import { roundTexts } from '@/lib/texts/round-texts';

export const metadata: Metadata = {
  title: roundTexts.title,
  manifest: '/round.webmanifest',
  appleWebApp: { capable: true, title: roundTexts.appName, statusBarStyle: 'default' },
  // A count of plants is no telephone number.
  formatDetection: { telephone: false },
};

// The keypad must not slide under the notch, and a double tap must not zoom it; pinching stays.
export const viewport: Viewport = { width: 'device-width', initialScale: 1, viewportFit: 'cover', interactiveWidget: 'resizes-content' };

/** Field pages: made once at build time, kept on the phone, with targets for a glove and no mid-grey. */
export default function RoundLayout({ children }: { children: ReactNode }) {
  return <div data-place="field">{children}</div>;
}
