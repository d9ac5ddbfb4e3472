import { readFileSync } from 'node:fs';
import { expect, type Page } from '@playwright/test';

interface DemoPerson {
  readonly key: string;
  readonly name: string;
  readonly email: string;
}

interface Demo {
  readonly password: string;
  readonly shops: readonly { readonly people: readonly DemoPerson[] }[];
}

const demo = JSON.parse(
  readFileSync(new URL('../../test-data/shops/demo.json', import.meta.url), 'utf8'),
) as Demo;

/** The password of every person of the demo. */
export const demoPassword = demo.password;

/** A person of the demo by key, such as `nell`, the first shop's foreman. */
export function demoPerson(key: string): DemoPerson {
  const person = demo.shops.flatMap(({ people }) => people).find((one) => one.key === key);
  if (person === undefined) throw new Error(`The demo has nobody called ${key}.`);
  return person;
}

/** Opens a page of the application as a person of the demo, through the sign-in page. */
export async function signIn(page: Page, key: string, to = '/'): Promise<void> {
  await page.goto(to);
  await page.getByLabel('E-mail').fill(demoPerson(key).email);
  await page.getByLabel('Password').fill(demoPassword);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('heading', { name: 'Sign in' })).toHaveCount(0);
}
