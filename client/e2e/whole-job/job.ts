import type { Locator, Page } from '@playwright/test';
import type { Page as ListPage } from '@second-spanner/shared/contracts/paging';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { SheetSummary } from '@second-spanner/shared/contracts/sheets';
import { Hand } from './hand.js';
import type { Work } from './work-through.js';

/** Two people on one sheet see each other's work within two seconds, without reloading. */
export const soon = { timeout: 2_000 };

/** Who is on the job: their pages, and the sheet that they work. */
export interface Job {
  readonly builder: Page;
  readonly second: Page;
  readonly foreman: Page;
  readonly work: Work;
}

/** The signed-in three on the sheet with this code. */
export async function openJob(
  people: Pick<Job, 'builder' | 'second' | 'foreman'>,
  sheetCode: string,
): Promise<Job> {
  const [builder, second] = [new Hand(people.builder), new Hand(people.second)];
  const { items } = await builder.get<ListPage<SheetSummary>>('/sheets');
  const sheet = items.find(({ code }) => code === sheetCode);
  if (sheet === undefined) throw new Error(`There is no sheet ${sheetCode}.`);
  const tools = await builder.get<readonly Tool[]>('/tools');
  return { ...people, work: { sheetId: sheet.id, builder, second, tools } };
}

/** The address of a page of the sheet: `steps/11.3`. */
export const pageOf = ({ work }: Job, rest: string): string => `/sheets/${work.sheetId}/${rest}`;

export const button = (page: Page, name: string | RegExp): Locator => page.getByRole('button', { name });

/** Presses what keeps something, and waits until the api has it. */
export async function keep(
  page: Page,
  pressed: Locator,
  of: 'entries' | 'second-readings' | 'countersignatures',
): Promise<number> {
  const answered = page.waitForResponse(
    (response) => response.request().method() === 'POST' && response.url().endsWith(`/${of}`),
  );
  await pressed.click();
  return (await answered).status();
}
