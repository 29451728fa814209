import { AxeBuilder } from '@axe-core/playwright';
import { type Browser, chromium, type Page } from 'playwright-core';
import { expect } from 'vitest';

/** Debian's Chromium, with flags that let it run as root and keep it from calling anywhere. */
export const launchBrowser = (): Promise<Browser> =>
  chromium.launch({
    executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
    args: [
      '--headless',
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });

/** Fails on any violation that axe finds on the page as it is now, naming rule, help and element. */
export const expectAccessible = async (page: Page): Promise<void> => {
  const { violations } = await new AxeBuilder({ page }).analyze();
  const found = violations.flatMap((violation) =>
    violation.nodes.map((node) => `${violation.id}: ${violation.help} at ${node.target.join(' ')}`),
  );
  expect(found).toEqual([]);
};

/**
 * Collects what a page complains about from now on: errors, console errors, refused resources.
 * @returns the complaints so far; it grows
 */
export const watchComplaints = (page: Page): string[] => {
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(error.message));
  page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(message.text());
  });
  return complaints;
};
