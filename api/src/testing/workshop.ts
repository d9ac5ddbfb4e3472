import type { Role } from '@second-spanner/shared/contracts/people';
import type { NewCar } from '../car-files/cars.service.js';
import type { Services } from '../services.js';

export const demoPassword = 'parallel-spanners-61';

const usualCar = {
  year: 1961,
  engineCode: 'AT18',
  engineNumber: 'AT18-20417',
  chassisNumber: 'AT-61-0093',
  registration: null,
  colour: null,
  notes: '',
  ownerId: null,
  ownerName: null,
} satisfies Partial<NewCar>;

/** Ids of what `openWorkshop` made. */
export interface Workshop {
  readonly shop: string;
  readonly otherShop: string;
  readonly people: Readonly<Record<'nell' | 'tomasz' | 'imogen' | 'ravi' | 'oona' | 'hana', string>>;
  readonly cars: Readonly<Record<'ravis' | 'oonas' | 'otherShops', string>>;
  readonly tool: string;
}

/** Two shops with invented people, cars and a tool, for tests. */
export async function openWorkshop({ people, cars, tools }: Services): Promise<Workshop> {
  const shop = await people.openShop({ name: 'Low Mill Motor Works', dialect: 'british', demo: true });
  const otherShop = await people.openShop({ name: 'Harbour Lane Engines', dialect: 'american', demo: true });
  const person = (shopId: string, name: string, email: string, role: Role): Promise<string> =>
    people.add(shopId, { name, email, role, password: demoPassword });
  const ids = {
    nell: await person(shop, 'Nell Okafor', 'nell@lowmill.example', 'foreman'),
    tomasz: await person(shop, 'Tomasz Brandt', 'tomasz@lowmill.example', 'builder'),
    imogen: await person(shop, 'Imogen Vale', 'imogen@lowmill.example', 'countersigner'),
    ravi: await person(shop, 'Ravi Lindqvist', 'ravi@lowmill.example', 'car-owner'),
    oona: await person(shop, 'Oona Marsh', 'oona@lowmill.example', 'car-owner'),
    hana: await person(otherShop, 'Hana Whitlock', 'hana@harbourlane.example', 'foreman'),
  };
  const car = (shopId: string, code: string, ownerId: string | null): Promise<string> =>
    cars.add(shopId, { ...usualCar, code, name: `Aldwyn Tern ${code}`, ownerId });
  return {
    ...{ shop, otherShop, people: ids },
    cars: {
      ravis: await car(shop, 'LM-C01', ids.ravi),
      oonas: await car(shop, 'LM-C02', ids.oona),
      otherShops: await car(otherShop, 'HL-C01', null),
    },
    tool: await tools.add(shop, {
      code: 'T-01',
      name: 'Outside micrometer 0–25 mm',
      kind: 'micrometer',
      low: { value: 0, unit: 'mm' },
      high: { value: 25, unit: 'mm' },
      resolution: { value: 0.01, unit: 'mm' },
      uncertainty: { value: 0.004, unit: 'mm' },
      calibrationDue: '2027-03-31',
    }),
  };
}
