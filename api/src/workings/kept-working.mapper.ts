import type { KeptWorking } from '@second-spanner/shared/contracts/kept-workings';
import type { KeptWorkingRow } from './kept-working.entity.js';

export function toKeptWorking({ keptByName, keptAt, ...row }: KeptWorkingRow): KeptWorking {
  const { id, carId, working, title, typed } = row;
  return { id, carId, working, title, typed, keptBy: keptByName, keptAt: keptAt.toISOString() };
}
