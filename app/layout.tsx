import type { Metadata, Viewport } from 'next';
import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import './fonts';
import './globals.css';
import { THEME_COOKIE, toTheme } from '@/components/shell/theme';

export const metadata: Metadata = {
  title: { default: 'Leeside', template: '%s · Leeside' },
  description: 'Plan, approve, run and prove UV-C disinfection of rooms with mobile 254 nm emitters.',
};

export const viewport: Viewport = { width: 'device-width', initialScale: 1, themeColor: '#12323F' };

export default async function RootLayout({ children }: { children: ReactNode }) {
  const theme = toTheme((await cookies()).get(THEME_COOKIE)?.value);
  return (
    <html lang="en" data-theme={theme === 'system' ? undefined : theme}>
      <body>{children}</body>
    </html>
  );
}
