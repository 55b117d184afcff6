import type { Metadata, Viewport } from 'next';
import { headers } from 'next/headers';
import type { ReactNode } from 'react';
import { Providers } from '@/components/providers';
import { FONT_CLASSES } from './fonts';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Tarebook', template: '%s · Tarebook' },
  description: 'Whether a contractor’s refrigerant recoveries are any good, from what the scale said.',
};

export const viewport: Viewport = {
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#3a4347' },
    { media: '(prefers-color-scheme: dark)', color: '#0b0e0f' },
  ],
};

export default async function RootLayout({ children }: { children: ReactNode }) {
  const nonce = (await headers()).get('x-nonce') ?? undefined;
  return (
    // The theme is set on this element by a script before the first paint, which React must not take for a mistake.
    <html lang="en" className={FONT_CLASSES} suppressHydrationWarning>
      <body>
        <Providers nonce={nonce}>{children}</Providers>
      </body>
    </html>
  );
}
