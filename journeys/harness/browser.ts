import { chromium } from 'playwright-core';
import type { Browser, BrowserContext, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, inject } from 'vitest';
import './provided';

export const THEMES = ['light', 'dark', 'sun'] as const;
export type Theme = (typeof THEMES)[number];

export const DESK = { width: 1440, height: 900 };
export const PHONE = { width: 390, height: 844 };

const ARGS = [
  '--no-sandbox',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

export interface OpenOptions {
  size?: { width: number; height: number };
  theme?: Theme;
  touch?: boolean;
}

/** Browser errors a journey brings about on purpose, e.g. a refused save. */
export type Expected = (text: string) => boolean;

/** One Chromium a file. What a page writes to the console as an error fails the test that caused it. */
export function useBrowser() {
  let browser: Browser;
  let contexts: BrowserContext[] = [];
  let errors: string[] = [];
  let expected: Expected = () => false;

  beforeAll(async () => {
    browser = await chromium.launch({ executablePath: '/usr/bin/chromium', args: ARGS });
  });
  afterEach(async () => {
    await Promise.all(contexts.map((context) => context.close()));
    const unexpected = errors.filter((text) => !expected(text));
    contexts = [];
    errors = [];
    expected = () => false;
    if (unexpected.length > 0) throw new Error(`The page wrote errors:\n${unexpected.join('\n')}`);
  });
  afterAll(() => browser.close());

  return {
    /** A page of its own person: nothing is shared with another. */
    async open({ size = DESK, theme = 'light', touch = false }: OpenOptions = {}): Promise<Page> {
      const context = await browser.newContext({
        baseURL: inject('url'),
        viewport: size,
        hasTouch: touch,
        isMobile: touch,
        reducedMotion: 'reduce',
      });
      contexts.push(context);
      await context.addInitScript(
        (chosen) => localStorage.setItem('fairlead.theme', chosen),
        theme,
      );
      const page = await context.newPage();
      page.on('console', (message) => {
        if (message.type() === 'error') errors.push(message.text());
      });
      page.on('pageerror', (error) => errors.push(String(error)));
      return page;
    },
    expectErrors(matches: Expected) {
      expected = matches;
    },
  };
}
