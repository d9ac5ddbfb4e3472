import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { expect, type Page } from '@playwright/test';
import type { AxeResults, RunOptions } from 'axe-core';

declare global {
  interface Window {
    axe: { run(options: RunOptions): Promise<AxeResults> };
  }
}

const source = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

const rules: RunOptions = {
  runOnly: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'],
  resultTypes: ['violations'],
};

/** Of all rules these alone depend on the light. */
const rulesOfColour: RunOptions = {
  runOnly: { type: 'rule', values: ['color-contrast', 'link-in-text-block'] },
  resultTypes: ['violations'],
};

/** Looks a page over as it stands, in daylight and in lamplight, and expects nothing to be found. */
export async function expectNoAxeViolations(page: Page): Promise<void> {
  await page.evaluate(source);
  const before = await page.evaluate(() => document.body.dataset['light']);
  for (const [light, asked] of [
    ['day', rules],
    ['lamp', rulesOfColour],
  ] as const) {
    await page.evaluate((name) => {
      document.body.dataset['light'] = name;
      // Colours that are still on their way from one light to the other are nobody's.
      const onTheirWay = document.getAnimations().filter((each) => each instanceof CSSTransition);
      return Promise.allSettled(onTheirWay.map(({ finished }) => finished));
    }, light);
    const { violations } = await page.evaluate((options) => window.axe.run(options), asked);
    const found = violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' | ')}`);
    expect(found, `in ${light}light`).toEqual([]);
  }
  await page.evaluate((name) => {
    document.body.dataset['light'] = name;
  }, before);
}
