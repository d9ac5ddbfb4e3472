import { readFile } from 'node:fs/promises';
import type { KeepWorkingRequest } from '@second-spanner/shared/contracts/kept-workings';
import type { Dialect, Role } from '@second-spanner/shared/contracts/people';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { EditionState } from '@second-spanner/shared/contracts/spec';
import type { DemoSightings, DemoWork } from './demo-sheet-file.js';

/** A value of a spec's file that one edition has otherwise. A step in a list of keyed things is its key. */
export interface Difference {
  readonly path: readonly string[];
  readonly value: unknown;
}

export interface DemoEdition {
  readonly edition: number;
  readonly state: EditionState;
  /** Key of a person. */
  readonly approvedBy: string | null;
  readonly approvedDaysAgo: number | null;
  readonly restsOn: string;
  readonly differs: readonly Difference[];
}

export interface DemoShop extends DemoWork {
  readonly key: string;
  readonly name: string;
  readonly dialect: Dialect;
  readonly people: readonly {
    readonly key: string;
    readonly name: string;
    readonly email: string;
    readonly role: Role;
  }[];
  readonly tools: readonly (Omit<Tool, 'id' | 'calibrationDue'> & {
    readonly calibrationDueInDays: number;
  })[];
  readonly cars: readonly {
    readonly code: string;
    readonly name: string;
    readonly year: number;
    readonly engineCode: string;
    readonly engineNumber: string;
    readonly chassisNumber: string;
    readonly registration: string | null;
    readonly colour: string | null;
    /** Key of a person. */
    readonly owner: string | null;
    readonly ownerName: string | null;
    readonly notes: string;
  }[];
  readonly specs: readonly {
    readonly code: string;
    /** Under test-data. */
    readonly file: string;
    readonly editions: readonly DemoEdition[];
  }[];
  readonly keptWorkings: readonly DemoKeptWorking[];
}

/** A working kept with a car, by its code and the person's key. */
export interface DemoKeptWorking extends KeepWorkingRequest {
  readonly car: string;
  readonly by: string;
  readonly daysAgo: number;
}

export interface DemoFile {
  readonly password: string;
  readonly sightings: DemoSightings;
  readonly shops: readonly DemoShop[];
}

const testData = new URL('../../../test-data/', import.meta.url);

/** Reads a JSON file under test-data. */
export async function readTestData(path: string): Promise<unknown> {
  return JSON.parse(await readFile(new URL(path, testData), 'utf8'));
}

/** The demo as it is written down for people to read. */
export const readDemo = async (): Promise<DemoFile> => (await readTestData('shops/demo.json')) as DemoFile;
