import type { Metadata, Viewport } from 'next';
import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { Messages } from '@/components/ui/message';
import { LOOK_COOKIE, readLook } from '@/components/shell/look';
import { fontVariables } from './fonts';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Lotwright', template: '%s · Lotwright' },
  description: 'Out, proved, back: batches of aircraft parts, their processors and their papers.',
  robots: { index: false, follow: false },
};

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  viewportFit: 'cover',
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#FAF8F3' },
    { media: '(prefers-color-scheme: dark)', color: '#181A1B' },
  ],
};

export default async function RootLayout({ children }: { children: ReactNode }) {
  const look = readLook((await cookies()).get(LOOK_COOKIE)?.value);
  return (
    <html lang="en" className={fontVariables}>
      <body className={look}>
        {children}
        <Messages />
      </body>
    </html>
  );
}
