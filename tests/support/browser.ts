import { AxeBuilder } from '@axe-core/playwright';
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';

/** The two sizes that every screen is tested at. */
export const sizes = {
  phone: { width: 390, height: 844 },
  wide: { width: 1440, height: 900 },
} as const;
export type SizeName = keyof typeof sizes;

/** Chromium from Debian, without the background traffic that a closed network refuses. */
export function launchBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
      '--no-first-run',
    ],
  });
}

export interface OpenedPage {
  readonly context: BrowserContext;
  readonly page: Page;
  /** Console errors and uncaught exceptions so far; a screen that works has none. */
  readonly complaints: string[];
}

/** A fresh browser profile of one size and theme, collecting what the page complains of. */
export async function openPage(browser: Browser, size: SizeName, colorScheme: 'light' | 'dark' = 'light'): Promise<OpenedPage> {
  const context = await browser.newContext({ viewport: sizes[size], colorScheme, hasTouch: size === 'phone', reducedMotion: 'reduce' });
  const page = await context.newPage();
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(String(error)));
  page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(message.text());
  });
  return { context, page, complaints };
}

const WCAG_22_AA = { type: 'tag', values: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'] } as const;
/** What another theme can change. */
const COLOURS = { type: 'rule', values: ['color-contrast'] } as const;

/**
 * What axe finds against WCAG 2.2 AA, or of its colours alone, one line each. Selectors are made for violations only and no second
 * page is opened for frames, which there are none of: most of axe's time.
 */
export async function axeFindings(page: Page, look: 'all' | 'colours' = 'all'): Promise<string[]> {
  const runOnly = look === 'all' ? WCAG_22_AA : COLOURS;
  const builder = new AxeBuilder({ page }).options({ runOnly: { ...runOnly, values: [...runOnly.values] }, resultTypes: ['violations'] });
  const { violations } = await builder.setLegacyMode(true).analyze();
  return violations.flatMap((violation) => violation.nodes.map((node) => `${violation.id}: ${node.target.join(' ')}`));
}
