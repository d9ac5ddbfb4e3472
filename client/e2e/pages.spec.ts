import { expect, test, type Page } from '@playwright/test';
import { expectNoAxeViolations } from './axe.js';
import { carPage, enter, newSheet, sheetPage, specPage } from './places.js';
import type { Hand } from './whole-job/hand.js';

interface Place {
  readonly name: string;
  /** Key of the person who looks. */
  readonly who: string;
  readonly at: (hand: Hand) => string | Promise<string>;
  /** What stands there once the page is whole. */
  readonly sees: string | RegExp;
}

const step = (code: string, sees: string | RegExp, sheet = 'LM-0147', who = 'tomasz'): Place => ({
  name: `step ${code} of ${sheet}`,
  who,
  at: (hand) => sheetPage(hand, sheet, `/steps/${code}`),
  sees,
});
const onNewSheet = (rest: string, sees: string | RegExp): Place => ({
  name: `${rest} of a new sheet`,
  who: 'tomasz',
  at: async (hand) => `${await newSheet(hand)}${rest}`,
  sees,
});

const places: readonly Place[] = [
  { name: "a builder's bench", who: 'tomasz', at: () => '/', sees: 'What waits for Tomasz' },
  { name: "a foreman's bench", who: 'nell', at: () => '/', sees: 'What waits for Nell' },
  { name: "an owner's bench", who: 'ravi', at: () => '/', sees: 'What waits for Ravi' },
  { name: 'the cars', who: 'tomasz', at: () => '/cars', sees: 'Calder Vee 3.4' },
  { name: 'a car file', who: 'nell', at: (hand) => carPage(hand, 'LM-C01'), sees: 'T61-04471' },
  { name: 'the spec book', who: 'nell', at: () => '/specs', sees: 'AT18' },
  ...['engine', 'fasteners', 'ignition'].map((section) => ({
    name: `a spec, ${section}`,
    who: 'tomasz',
    at: (hand: Hand) => specPage(hand, 'AT18', `/2/${section}`),
    sees: 'Values',
  })),
  { name: 'the sheets', who: 'nell', at: () => '/sheets', sees: 'LM-0139' },
  {
    name: 'a planned sheet',
    who: 'tomasz',
    at: (hand) => sheetPage(hand, 'LM-0151'),
    sees: 'Put it on the stand',
  },
  {
    name: 'the history',
    who: 'nell',
    at: (hand) => sheetPage(hand, 'LM-0147', '/history'),
    sees: /^Recorded/,
  },
  {
    name: 'the snags',
    who: 'nell',
    at: (hand) => sheetPage(hand, 'LM-0147', '/snags'),
    sees: /over the limit/,
  },
  {
    name: 'a sign-off to sign',
    who: 'imogen',
    at: (hand) => sheetPage(hand, 'LM-0143', '/sign-off'),
    sees: 'Sign as the second person',
  },
  { name: "an owner's sheets", who: 'ravi', at: () => '/sheets', sees: 'LM-0147' },
  step('1.2', 'Stampings and casting marks'),
  step('3.14', 'Crankshaft end float'),
  step('6.19', 'Crank pulley run-out at the groove'),
  step('6.6', 'Tighten the oil pump bolts'),
  step('8.6', 'Tighten the head nuts'),
  step('11.1', 'Cylinder 1 at compression TDC'),
  step('11.13', 'Wiring map, as fitted'),
  step('11.1', 'Cylinder 1 at compression TDC', 'LM-0143'),
  step('11.12', 'Wiring map, as fitted', 'LM-0139', 'nell'),
  step('6.3/second', 'Oil pump end clearance', 'LM-0147', 'imogen'),
  step('6.20/second', 'Tighten the flywheel bolts', 'LM-0147', 'imogen'),
  onNewSheet('', 'Engine on its stand'),
  onNewSheet('/steps/1.1', 'How did you find it?'),
  onNewSheet('/steps/1.2', 'Photo of'),
  onNewSheet('/steps/1.14', 'Reading, '),
  { name: 'the account', who: 'tomasz', at: () => '/account', sees: 'Trade words' },
  {
    name: 'an address without a page',
    who: 'tomasz',
    at: () => '/nowhere',
    sees: 'There is no page under this address',
  },
];

const widthsOf = (page: Page): readonly number[] =>
  (page.viewportSize()?.width ?? 0) < 600 ? [320, 360, 430] : [768, 960, 1280, 1440];

/** At every width of the window the page is as wide as it, and does not scroll sideways. */
async function expectNoSidewaysScrolling(page: Page): Promise<void> {
  const size = page.viewportSize() ?? { width: 0, height: 800 };
  for (const width of widthsOf(page)) {
    await page.setViewportSize({ width, height: size.height });
    await expect
      .poll(() => page.evaluate(() => document.documentElement.scrollWidth), { message: `at ${width}` })
      .toBe(width);
  }
  await page.setViewportSize(size);
}

async function expectWhole(page: Page, sees: string | RegExp): Promise<void> {
  await expect(page.getByText(sees).filter({ visible: true }).first()).toBeVisible();
  await expect(page.getByText(/^Reading .*…$/)).toHaveCount(0);
}

// Each person signs in once and goes from page to page.
for (const who of ['tomasz', 'imogen', 'nell', 'ravi']) {
  test.describe(`for ${who},`, () => {
    let page: Page;
    let hand: Hand;
    test.beforeAll(async ({ browser }) => {
      page = await browser.newPage();
      hand = await enter(page, who);
    });
    test.afterAll(() => page.close());

    for (const place of places.filter((each) => each.who === who)) {
      test(`${place.name}: readable by everybody, in both lights, at every width`, async () => {
        await page.goto(await place.at(hand));
        await expectWhole(page, place.sees);
        await expectNoSidewaysScrolling(page);
        await expectNoAxeViolations(page);
      });
    }
  });
}

test('the sign-in: readable by everybody, in both lights, at every width', async ({ page }) => {
  await page.goto('/sign-in');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expectWhole(page, 'Write your password.');
  await expectNoSidewaysScrolling(page);
  await expectNoAxeViolations(page);
});

test('a code on paper: readable by everybody, in both lights, at every width', async ({ page }) => {
  const hand = await enter(page, 'nell');
  const released = await hand.get<{ verificationCode: string }>(
    `/sheets/${(await sheetPage(hand, 'LM-0139')).split('/').at(-1) ?? ''}`,
  );
  await page.context().clearCookies();
  for (const [code, sees] of [
    [released.verificationCode, 'Calder Vee 3.4'],
    ['AAAA-AAAA', 'No released sheet has this code'],
  ] as const) {
    await page.goto(`/v/${code}`);
    await expectWhole(page, sees);
    await expectNoSidewaysScrolling(page);
    await expectNoAxeViolations(page);
  }
});
