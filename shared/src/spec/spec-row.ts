import type { Source, Sourced } from '../contracts/spec.js';
import { sourceText } from './source-text.js';

/** The parts of a spec, in the order in which they are shown. Titles may hold trade-word tokens. */
export const specSections = [
  { key: 'engine', title: 'Engine' },
  { key: 'ignition', title: 'Ignition' },
  { key: 'valve-train', title: 'Valve timing and {clearances}' },
  { key: 'tightening', title: 'Tightening' },
  { key: 'clearances', title: 'Sizes and fits' },
  { key: 'keys', title: 'Keys and keyways' },
  { key: 'belt', title: 'Belt' },
  { key: 'compounds', title: 'Compounds and consumables' },
  { key: 'parts', title: 'Parts and cautions' },
] as const;
export type SpecSection = (typeof specSections)[number]['key'];

/** One value of a spec as it is read on a page or on paper. */
export interface SpecRow {
  /** Where the value stands in the document; the same in every edition: `fastenerGroups.head-nuts.torque`. */
  readonly key: string;
  readonly section: SpecSection;
  /** In a builder's words. Trade-word tokens such as `{sump}` allowed. */
  readonly label: string;
  /** The value with its unit. */
  readonly printed: string;
  /** What a reading of it may be, where the spec gives it. */
  readonly limits?: string;
  /** The other figure that the same page prints. */
  readonly alsoPrinted?: string;
  readonly source: Source | undefined;
  readonly sourceText: string;
  readonly note?: string;
}

interface Cell<T> {
  readonly key: string;
  readonly label: string;
  readonly sourced: Sourced<T> | undefined;
  readonly print: (value: T) => string;
  readonly limits?: string | undefined;
  readonly alsoPrinted?: string | undefined;
}

/** A section's rows, one for each value that the document has. */
export class RowList {
  readonly rows: SpecRow[] = [];

  constructor(
    private readonly section: SpecSection,
    private readonly path: string,
  ) {}

  /** Adds a row unless the document has no such value. */
  add<T>({ key, label, sourced, print, limits, alsoPrinted }: Cell<T>): this {
    if (!sourced) return this;
    this.rows.push({
      key: this.path === '' ? key : `${this.path}.${key}`,
      section: this.section,
      label,
      printed: print(sourced.value),
      ...(limits !== undefined && { limits }),
      ...(alsoPrinted !== undefined && { alsoPrinted }),
      source: sourced.source,
      sourceText: sourceText(sourced.source),
      ...(sourced.note !== undefined && { note: sourced.note }),
    });
    return this;
  }
}
