/** Playwright's test, failing also when a page complains: console errors, policy violations. */

import { test as base, type Page } from '@playwright/test';

export const test = base.extend<{ complaints: string[] }>({
  complaints: [
    async ({ context }, use) => {
      const complaints: string[] = [];
      const listen = (page: Page) => {
        page.on('console', (message) => {
          if (message.type() === 'error') complaints.push(`${page.url()}: ${message.text()}`);
        });
        page.on('pageerror', (error) => complaints.push(`${page.url()}: ${error.message}`));
      };
      context.pages().forEach(listen);
      context.on('page', listen);
      await use(complaints);
      if (complaints.length > 0)
        throw new Error(`The page complained:\n${complaints.join('\n')}`);
    },
    { auto: true },
  ],
});

export { expect } from '@playwright/test';
