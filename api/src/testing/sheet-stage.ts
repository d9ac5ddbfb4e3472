import { openWorkshop, type Workshop } from './workshop.js';
import { scenes } from './sheet-scenes.js';
import { SheetHand } from './sheet-hand.js';
import { asSignedIn, smallSheets, type SmallSheet } from './small-sheet.js';
import { startTestApp, type TestApp, type TestAppOptions } from './test-app.js';
import { signedInClient, type TestClient } from './test-client.js';

type Name = 'nell' | 'tomasz' | 'imogen' | 'ravi' | 'oona' | 'bea' | 'hana';

/** An application with a workshop, its people signed in, and small sheets to work. */
export interface SheetStage {
  readonly app: TestApp;
  readonly workshop: Workshop;
  readonly small: SmallSheet;
  /** Ids by name; `bea` is a second builder. */
  readonly ids: Readonly<Record<Name, string>>;
  readonly clients: Readonly<Record<Name, TestClient>>;
  /** A new sheet on the stand, in everybody's hands. */
  newSheet(): Promise<Hands>;
  close(): Promise<void>;
}

export type Hands = Readonly<Record<Name, SheetHand>> & { readonly id: string };

const names: readonly Name[] = ['nell', 'tomasz', 'imogen', 'ravi', 'oona', 'bea', 'hana'];

export async function openStage(options: TestAppOptions = {}): Promise<SheetStage> {
  const app = await startTestApp(options);
  const workshop = await openWorkshop(app.services);
  const bea = await app.services.people.add(workshop.shop, {
    ...{ name: 'Bea Holm', email: 'bea@lowmill.example', role: 'builder' },
    password: 'parallel-spanners-61',
  });
  const small = await smallSheets(app.services, workshop);
  const clients = Object.fromEntries(
    await Promise.all(
      names.map(async (name) => {
        const house = name === 'hana' ? 'harbourlane' : 'lowmill';
        return [name, await signedInClient(app.address, `${name}@${house}.example`)] as const;
      }),
    ),
  ) as Record<Name, TestClient>;
  return {
    ...{ app, workshop, small, clients, ids: { ...workshop.people, bea } },
    newSheet: async () => {
      const id = await small.layOut();
      const hands = names.map((name) => [name, new SheetHand(clients[name], id)] as const);
      return { ...(Object.fromEntries(hands) as Record<Name, SheetHand>), id };
    },
    close: () => app.close(),
  };
}

/** Records step 1.1 and both places of step 1.2, by the builder. */
export async function recordClearances(
  { tomasz }: Hands,
  { tools }: SmallSheet,
  [first, second]: readonly [number, number] = [0.045, 0.044],
): Promise<void> {
  await tomasz.record('1.1', scenes.check()).expect(201);
  await tomasz.record('1.2', scenes.clearance(tools, 'Main 1', first)).expect(201);
  await tomasz.record('1.2', scenes.clearance(tools, 'Main 2', second)).expect(201);
}

/** Works the whole small sheet until nothing is missing. */
export async function workAll(hands: Hands, stage: SheetStage): Promise<void> {
  const { tomasz, imogen } = hands;
  const { tools } = stage.small;
  await recordClearances(hands, stage.small);
  await imogen.readAgain('1.2', scenes.clearanceAgain(tools, 0.046, 0.045)).expect(201);
  await imogen.countersign('1.2').expect(201);
  for (const nut of ['1', '2']) await tomasz.record('1.3', scenes.pull(tools, 1, nut, 30)).expect(201);
  await imogen.readAgain('1.3', scenes.settingSeen(tools, 55)).expect(201);
  for (const nut of ['1', '2']) await tomasz.record('1.3', scenes.pull(tools, 2, nut, 55)).expect(201);
  await imogen.countersign('1.3', ['1', '2']).expect(201);
  await tomasz.record('2.1', { kind: 'wiring', fitted: scenes.leads }).expect(201);
  await imogen.readAgain('2.1', { kind: 'read-again', fitted: scenes.leads }).expect(201);
  await imogen.countersign('2.1').expect(201);
  await tomasz.record('2.2', { kind: 'valve-timing', ...scenes.sightings }).expect(201);
  await imogen.readAgain('2.2', { kind: 'read-again', ...scenes.sightings }).expect(201);
  await imogen.countersign('2.2').expect(201);
  await tomasz.record('2.3', scenes.check()).expect(201);
  const seen = { kind: 'inspected', outcome: 'pass', seen: ['strap', 'bolt'] } as const;
  await imogen.readAgain('2.3', seen).expect(201);
  await imogen.countersign('2.3').expect(201);
  const fileId = await storePhoto(stage);
  await tomasz.record('2.4', { kind: 'photo', shows: 'Timing marks', fileId }).expect(201);
}

/** Stores a small photo by the builder and answers its id. */
export async function storePhoto({ app, workshop }: SheetStage): Promise<string> {
  const tomasz = asSignedIn(workshop, 'tomasz', 'Tomasz Brandt', 'builder');
  return (await app.services.files.add(tomasz, smallPng)).id;
}

/** One blue pixel as PNG. */
const smallPng = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNkYPj/HwADBwIAMCbHYQAAAABJRU5ErkJggg==',
  'base64',
);
