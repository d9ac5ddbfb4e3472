import { randomUUID } from 'node:crypto';
import type { CarSummary } from '@second-spanner/shared/contracts/car-files';
import type { KeptWorking } from '@second-spanner/shared/contracts/kept-workings';
import type { Page } from '@second-spanner/shared/contracts/paging';
import type { CarsService } from '../car-files/cars.service.js';
import type { Database, ShopScope } from '../platform/database/database.js';
import { badInput, notFound } from '../platform/errors/http-problem.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import { pageOf, type Paging } from '../platform/validation/paging.js';
import { toKeptWorking } from './kept-working.mapper.js';
import type { KeepWorkingDto } from './kept-workings.dto.js';
import { KeptWorkingsRepository } from './kept-workings.repository.js';
import { readTyped } from './read-typed.js';
import { loadWorking, workOut } from './work-out.js';

/** Workings kept with a car. They record nothing of the engine, and stay as they were kept. */
export class KeptWorkingsService {
  constructor(
    private readonly database: Database,
    private readonly cars: Pick<CarsService, 'summaryIn'>,
    private readonly now: () => Date,
  ) {}

  async list(who: SignedIn, carId: string, paging: Paging): Promise<Page<KeptWorking>> {
    const rows = await this.database.readShop(who.shop.id, async (scope) => {
      await this.cars.summaryIn(who, scope, carId);
      return new KeptWorkingsRepository(scope, carId).list(paging);
    });
    return pageOf(rows, paging, ({ keptAt, id }) => [keptAt.toISOString(), id], toKeptWorking);
  }

  async find(who: SignedIn, carId: string, id: string): Promise<KeptWorking> {
    return (await this.findWithCar(who, carId, id)).kept;
  }

  async findWithCar(
    who: SignedIn,
    carId: string,
    id: string,
  ): Promise<{ car: CarSummary; kept: KeptWorking }> {
    return this.database.readShop(who.shop.id, async (scope) => {
      const car = await this.cars.summaryIn(who, scope, carId);
      return { car, kept: await read(scope, carId, id) };
    });
  }

  /** Keeps a case that can be worked out. Throws a 400 problem at the field that cannot. */
  async keep(
    who: SignedIn,
    carId: string,
    { working: key, title, typed }: KeepWorkingDto,
  ): Promise<KeptWorking> {
    const working = await loadWorking(key);
    if (!working) throw badInput({ field: 'working', message: 'There is no such working.' });
    const read = readTyped(working, typed, 'typed.');
    workOut(working, read, who.person.dialect ?? who.shop.dialect, 'typed.');
    const kept = { id: randomUUID(), working: key, title, typed: read, keptAt: this.now() };
    await this.database.withShop(who.shop.id, async (scope) => {
      await this.cars.summaryIn(who, scope, carId);
      await new KeptWorkingsRepository(scope, carId).insert({ ...kept, keptBy: who.person.id });
    });
    return toKeptWorking({ ...kept, carId, keptByName: who.person.name });
  }
}

async function read(scope: ShopScope, carId: string, id: string): Promise<KeptWorking> {
  const row = await new KeptWorkingsRepository(scope, carId).find(id);
  if (!row) throw notFound('working');
  return toKeptWorking(row);
}
