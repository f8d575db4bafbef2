import type { Page } from '@playwright/test';

/** Writes down what goes wrong on a page without anybody seeing it: exceptions, logged errors, failed answers. */
export function watchPage(page: Page, faults: string[]): void {
  page.on('pageerror', (error) => faults.push(`exception: ${error.message}`));
  page.on('console', (message) => {
    if (message.type() === 'error') faults.push(`console: ${message.text()} (${message.location().url})`);
  });
  page.on('response', (response) => {
    if (response.status() >= 500) faults.push(`answer: ${response.status()} ${response.url()}`);
  });
}
