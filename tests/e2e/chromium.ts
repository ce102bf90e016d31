/** Debian's own Chromium, quiet and without a network of its own. */
export const CHROMIUM = {
  executablePath: '/usr/bin/chromium',
  args: [
    '--no-sandbox',
    '--disable-gpu',
    '--disable-quic',
    '--no-first-run',
    '--disable-background-networking',
    '--disable-component-update',
    '--disable-sync',
  ],
}

/** The date that the browser tests and the pictures are pinned to. */
export const TODAY = '2026-12-01'
