import { randomUUID } from 'node:crypto';
import type { CarFile, CarSummary } from '@second-spanner/shared/contracts/car-files';
import type { Page } from '@second-spanner/shared/contracts/paging';
import type { SheetSummary } from '@second-spanner/shared/contracts/sheets';
import type { Database, ShopScope } from '../platform/database/database.js';
import { notFound } from '../platform/errors/http-problem.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import { pageOf, type Paging } from '../platform/validation/paging.js';
import { toCarFile, toCarSummary } from './car.mapper.js';
import { CarsRepository } from './cars.repository.js';

/** The sheets of a car, newest change first; whoever may see the car may see them. */
export type SheetsOfCar = (scope: ShopScope, carId: string) => Promise<readonly SheetSummary[]>;

export interface NewCar {
  readonly code: string;
  readonly name: string;
  readonly year: number;
  readonly engineCode: string;
  readonly engineNumber: string;
  readonly chassisNumber: string;
  readonly registration: string | null;
  readonly colour: string | null;
  readonly notes: string;
  readonly ownerId: string | null;
  readonly ownerName: string | null;
}

/** Car files. A car owner has only their own. */
export class CarsService {
  constructor(
    private readonly database: Database,
    private readonly sheetsOfCar: SheetsOfCar,
  ) {}

  async list(who: SignedIn, paging: Paging): Promise<Page<CarSummary>> {
    const rows = await this.database.readShop(who.shop.id, (scope) => carsFor(who, scope).list(paging));
    return pageOf(rows, paging, ({ code }) => [code], toCarSummary);
  }

  async find(who: SignedIn, id: string): Promise<CarFile> {
    return this.database.readShop(who.shop.id, async (scope) => {
      const car = await carsFor(who, scope).find(id);
      if (!car) throw notFound('car');
      return toCarFile(car, await this.sheetsOfCar(scope, id));
    });
  }

  /** The car within somebody else's work on the database. Throws a 404 problem when it is not this person's to see. */
  readonly summaryIn = async (who: SignedIn, scope: ShopScope, id: string): Promise<CarSummary> => {
    const car = await carsFor(who, scope).find(id);
    if (!car) throw notFound('car');
    return toCarSummary(car);
  };

  /** Opens a car file and answers its id. */
  async add(shopId: string, car: NewCar): Promise<string> {
    const id = randomUUID();
    await this.database.withShop(shopId, (scope) => new CarsRepository(scope).insert({ ...car, id }));
    return id;
  }
}

const carsFor = ({ person }: SignedIn, scope: ShopScope): CarsRepository =>
  new CarsRepository(scope, person.role === 'car-owner' ? person.id : null);
