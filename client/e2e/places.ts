import { expect, type Page } from '@playwright/test';
import type { CarSummary } from '@second-spanner/shared/contracts/car-files';
import type { Page as ListPage } from '@second-spanner/shared/contracts/paging';
import type { PersonName } from '@second-spanner/shared/contracts/people';
import type { NewSheetRequest, Sheet, SheetSummary } from '@second-spanner/shared/contracts/sheets';
import type { SpecSummary } from '@second-spanner/shared/contracts/spec';
import { demoPassword, demoPerson } from './sign-in.js';
import { Hand } from './whole-job/hand.js';

/** Signs a person of the demo in past the sign-in page. */
export async function enter(page: Page, key: string): Promise<Hand> {
  const data = { email: demoPerson(key).email, password: demoPassword };
  const answer = await page.request.post('/api/session', { data });
  expect(answer.status()).toBe(200);
  return new Hand(page);
}

async function named<T extends { readonly code: string }>(
  hand: Hand,
  list: string,
  code: string,
): Promise<T> {
  const { items } = await hand.get<ListPage<T>>(`/${list}?limit=200`);
  const found = items.find((item) => item.code === code);
  if (found === undefined) throw new Error(`The demo has no ${code} in its ${list}.`);
  return found;
}

/** The address of a page of a sheet, by the sheet's code. */
export async function sheetPage(hand: Hand, code: string, rest = ''): Promise<string> {
  return `/sheets/${(await named<SheetSummary>(hand, 'sheets', code)).id}${rest}`;
}

export async function carPage(hand: Hand, code: string): Promise<string> {
  return `/cars/${(await named<CarSummary>(hand, 'cars', code)).id}`;
}

export async function specPage(hand: Hand, code: string, rest: string): Promise<string> {
  return `/specs/${(await named<SpecSummary>(hand, 'specs', code)).id}${rest}`;
}

/** Lays out a new sheet for the estate, puts it on the stand, and answers its address. */
export async function newSheet(hand: Hand): Promise<string> {
  const [car, spec, people] = [
    await named<CarSummary>(hand, 'cars', 'LM-C04'),
    await named<SpecSummary>(hand, 'specs', 'AT18'),
    await hand.get<readonly PersonName[]>('/people'),
  ];
  const idOf = (key: string) => people.find(({ name }) => name === demoPerson(key).name)?.id ?? '';
  const request: NewSheetRequest = {
    carId: car.id,
    specEditionId: spec.editions.find(({ state }) => state === 'approved')?.id ?? '',
    builderId: idOf('tomasz'),
    countersignerId: idOf('imogen'),
  };
  const { id } = await hand.post<Sheet>('/sheets', request);
  await hand.post<Sheet>(`/sheets/${id}/start`, {});
  return `/sheets/${id}`;
}
