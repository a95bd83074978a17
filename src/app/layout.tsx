import type { Metadata, Viewport } from 'next';
import localFont from 'next/font/local';
import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { LIGHT_COOKIE, lightPaper, parseLight, SUN_COOKIE, shownLight } from '@/ui/light';
import { ToastProvider } from '@/ui/toast';
import './globals.css';
import { SITE_WORDS } from '@/features/accounts/words/public';

const literata = localFont({
  src: '../../node_modules/@fontsource-variable/literata/files/literata-latin-wght-normal.woff2',
  weight: '200 900',
  variable: '--font-literata',
  adjustFontFallback: 'Times New Roman',
});

const sourceSans = localFont({
  src: '../../node_modules/@fontsource-variable/source-sans-3/files/source-sans-3-latin-wght-normal.woff2',
  weight: '200 900',
  variable: '--font-source-sans',
  adjustFontFallback: 'Arial',
});

export const metadata: Metadata = {
  title: { default: 'Windrest', template: '%s · Windrest' },
  description: SITE_WORDS.description,
  robots: { index: false, follow: false },
};

async function readLight() {
  const jar = await cookies();
  return shownLight(parseLight(jar.get(LIGHT_COOKIE)?.value), jar.get(SUN_COOKIE)?.value);
}

export async function generateViewport(): Promise<Viewport> {
  return { width: 'device-width', initialScale: 1, viewportFit: 'cover', themeColor: lightPaper(await readLight()) };
}

export default async function RootLayout({ children }: { children: ReactNode }) {
  return (
    <html lang="en" data-light={await readLight()} className={`${literata.variable} ${sourceSans.variable}`}>
      <body>
        <ToastProvider>{children}</ToastProvider>
      </body>
    </html>
  );
}
