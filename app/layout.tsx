import type { Metadata, Viewport } from 'next';
import localFont from 'next/font/local';
import { headers } from 'next/headers';
import type { ReactNode } from 'react';
import './globals.css';

const archivo = localFont({
  src: '../fonts/archivo-latin.woff2',
  variable: '--font-archivo',
  weight: '100 900',
  declarations: [{ prop: 'font-stretch', value: '62% 125%' }],
});

const b612Mono = localFont({
  src: '../fonts/b612-mono-latin.woff2',
  variable: '--font-b612-mono',
  weight: '400',
});

export const metadata: Metadata = {
  title: { default: 'Vaneloft', template: '%s · Vaneloft' },
  description: 'Plates of air-spaced variable capacitors, from the tuning law to the cut file.',
};

export const viewport: Viewport = { themeColor: '#f8fafa' };

export default async function RootLayout({ children }: { children: ReactNode }) {
  const nonce = (await headers()).get('x-nonce') ?? undefined;
  return (
    <html lang="en-GB" className={`${archivo.variable} ${b612Mono.variable}`}>
      <head>
        {/* React Aria reads it for the style element it adds. */}
        <meta property="csp-nonce" nonce={nonce} content="" />
      </head>
      <body>{children}</body>
    </html>
  );
}
