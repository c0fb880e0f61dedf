import type { Metadata, Viewport } from 'next';
import { connection } from 'next/server';
import { readTheme } from '@/components/shell/theme-cookie';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Holdoff: review it before you power it', template: '%s · Holdoff' },
  description: 'A shared review bench for power-switching circuits: draw, check, review and sign off one revision up to one voltage.',
};

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#D6DADD' },
    { media: '(prefers-color-scheme: dark)', color: '#191D21' },
  ],
};

/** Every page is rendered on request: the script nonce of its policy must be fresh, and the theme stands in a cookie, so that no script has to repaint it. */
export default async function RootLayout({ children }: { readonly children: React.ReactNode }) {
  await connection();
  const theme = await readTheme();
  return (
    <html lang="en" data-theme={theme ?? undefined}>
      <body>{children}</body>
    </html>
  );
}
