import './globals.css'
import { type Metadata, type Viewport } from 'next'
import { headers } from 'next/headers'
import { type ReactNode } from 'react'
import { StyleNonce } from '@/components/ui/style-nonce'
import { THEMES } from '@/tailwind.config'
import { fontVariables } from './fonts'

export const metadata: Metadata = {
  title: { default: 'Fuseward', template: '%s · Fuseward' },
  description:
    'The electrical-risk register for landlords and housing providers: what protects every home, which is likeliest to hurt somebody, and which report lapses when.',
  applicationName: 'Fuseward',
  formatDetection: { telephone: false, address: false, email: false },
}

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  colorScheme: 'light dark',
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: THEMES.light.surface },
    { media: '(prefers-color-scheme: dark)', color: THEMES.dark.surface },
  ],
}

export default async function RootLayout({ children }: { children: ReactNode }) {
  const nonce = (await headers()).get('x-nonce') ?? undefined
  return (
    <html lang="en-GB" className={fontVariables}>
      <body>
        <StyleNonce nonce={nonce} />
        {children}
      </body>
    </html>
  )
}
