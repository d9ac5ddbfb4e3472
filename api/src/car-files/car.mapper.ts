import type { CarFile, CarSummary } from '@second-spanner/shared/contracts/car-files';
import type { SheetSummary } from '@second-spanner/shared/contracts/sheets';
import type { CarRow } from './car.entity.js';

export function toCarSummary(row: CarRow): CarSummary {
  const { id, code, name, year, engineCode, engineNumber, ownerName, sheetCount } = row;
  return { id, code, name, year, engineCode, engineNumber, ownerName, sheetCount };
}

export function toCarFile(row: CarRow, sheets: readonly SheetSummary[]): CarFile {
  const { chassisNumber, registration, colour, notes } = row;
  return { ...toCarSummary(row), chassisNumber, registration, colour, notes, sheets };
}
