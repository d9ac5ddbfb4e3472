import { CarEntity } from '../../car-files/car.entity.js';
import { StoredFileEntity } from '../../files/stored-file.entity.js';
import { LedgerLineEntity } from '../../ledger/ledger-line.entity.js';
import { PersonEntity } from '../../people/person.entity.js';
import { SessionEntity } from '../../people/session.entity.js';
import { ShopEntity } from '../../people/shop.entity.js';
import { ToolEntity } from '../../registers/tool.entity.js';
import { SheetEntity } from '../../sheets/sheet.entity.js';
import { StepEntity } from '../../sheets/step.entity.js';
import { SpecEditionEntity } from '../../spec-book/spec-edition.entity.js';
import { SpecEntity } from '../../spec-book/spec.entity.js';
import { KeptWorkingEntity } from '../../workings/kept-working.entity.js';

/** Every entity, by name: nothing is found by searching folders. */
export const entities = [
  ShopEntity,
  PersonEntity,
  SessionEntity,
  CarEntity,
  ToolEntity,
  SpecEntity,
  SpecEditionEntity,
  SheetEntity,
  StepEntity,
  LedgerLineEntity,
  StoredFileEntity,
  KeptWorkingEntity,
];
