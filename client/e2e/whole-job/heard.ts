import type { Page } from '@playwright/test';

/** Everything that the api answers to a page from now on. */
export class Heard {
  private readonly texts: Promise<string>[] = [];

  constructor(page: Page) {
    page.on('response', (response) => {
      // The line on which changes are told never ends, and has no figures.
      const { pathname } = new URL(response.url());
      if (!pathname.startsWith('/api/') || pathname.endsWith('/events')) return;
      this.texts.push(response.text().catch(() => ''));
    });
  }

  /** All of it so far, as text. */
  async sofar(): Promise<string> {
    return (await Promise.all(this.texts)).join('\n');
  }
}
