import type { Metadata, Viewport } from 'next';
import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { fontVariables } from './_ui/fonts';
import { Providers } from './_ui/providers';
import { readTheme, themeCookie } from './_ui/theme';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Floorwright', template: '%s · Floorwright' },
  description: 'Plans staff shifts so that least cover holds at least cost, and proves it.',
};

export const viewport: Viewport = {
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#f5efe2' },
    { media: '(prefers-color-scheme: dark)', color: '#10212f' },
  ],
};

/** The frame of every page: fonts, theme and the data client. */
export default async function RootLayout({ children }: { readonly children: ReactNode }) {
  const theme = readTheme((await cookies()).get(themeCookie)?.value);
  return (
    <html lang="en" className={fontVariables} data-theme={theme}>
      <body>
        <Providers>{children}</Providers>
      </body>
    </html>
  );
}
