import type { Bench, BenchItem } from '@second-spanner/shared/contracts/sheets';
import type { Database } from '../platform/database/database.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { SheetReading } from '../sheets/sheet-reading.service.js';
import type { AwaitingRow } from './bench.entity.js';
import { toSheetItem, toStepItem } from './bench.mapper.js';
import { BenchRepository } from './bench.repository.js';

const mostItems = 50;

/** The most pressing first. */
const order: readonly BenchItem['kind'][] = ['snag', 'second-check', 'sign', 'release', 'next-step', 'read'];

/** What waits for a person. */
export class BenchService {
  constructor(
    private readonly database: Database,
    private readonly reading: SheetReading,
  ) {}

  async read(who: SignedIn): Promise<Bench> {
    const [items, onTheStand] = await Promise.all([
      this.items(who),
      this.reading.list(who, { state: 'on-the-stand', carId: null }, { after: null, limit: mostItems }),
    ]);
    const sorted = items.sort((a, b) => order.indexOf(a.kind) - order.indexOf(b.kind));
    return { items: sorted.slice(0, mostItems), onTheStand: onTheStand.items };
  }

  private async items({ shop, person }: SignedIn): Promise<BenchItem[]> {
    const seeker = { personId: person.id, isForeman: person.role === 'foreman' };
    return this.database.readShop(shop.id, async (scope) => {
      const bench = new BenchRepository(scope);
      if (person.role === 'car-owner') return (await bench.released(person.id)).map(toSheetItem);
      const snags = person.role === 'countersigner' ? [] : await bench.snags(seeker);
      const checks = calledFirst(await bench.secondChecks(seeker));
      const sheets = await bench.sheets(seeker);
      return [...snags.map(toStepItem), ...checks.map(toStepItem), ...sheets.map(toSheetItem)];
    });
  }
}

/** Those to which the person was called before the others. */
const calledFirst = (rows: readonly AwaitingRow[]): AwaitingRow[] => [
  ...rows.filter(({ calledBy }) => calledBy !== null),
  ...rows.filter(({ calledBy }) => calledBy === null),
];
