import { type Browser, chromium } from 'playwright-core';
import { findChromium } from './chromium.mjs';

/** Nothing that reaches for a network, and no first-run pages. */
const FLAGS = [
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** A headless Chromium with an empty profile of its own; the caller closes it. */
export function launchBrowser(): Promise<Browser> {
  const executablePath = findChromium();
  if (!executablePath)
    throw new Error('There is no Chromium. "npm test" installs one, or set CHROMIUM_PATH.');
  // Chromium's sandbox refuses to run as root.
  const args = process.getuid?.() === 0 ? [...FLAGS, '--no-sandbox'] : FLAGS;
  return chromium.launch({ executablePath, headless: true, args });
}
