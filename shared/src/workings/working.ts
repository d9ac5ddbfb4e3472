import type { Drawing } from '../drawing/shapes.js';
import type { Kind, Unit } from '../contracts/quantity.js';
import type { SpecDocument } from '../contracts/spec.js';
import type { Verdict } from '../contracts/verdict.js';

export const workingGroups = [
  'wiring',
  'valve-timing',
  'tightening',
  'fits-and-keys',
  'belt-drive',
  'measuring',
  'curing',
  'convert',
] as const;
export type WorkingGroup = (typeof workingGroups)[number];

/**
 * What was typed, by field, always as text: `27 lbf·ft`, `clockwise`, and for a list of rows as
 * `writeRows` makes it. An empty or missing text is a field left open.
 */
export type WorkingCase = Readonly<Record<string, string>>;

/**
 * The name in every case, of no field, of what the case was begun from: `AT18, edition 2: head nuts`, at most
 * `begunFromLength` characters.
 */
export const begunFrom = 'of';
export const begunFromLength = 120;

interface FieldBase {
  readonly name: string;
  /** Sentence case; trade-word tokens allowed. */
  readonly label: string;
  readonly hint?: string;
  /** It may stay empty, and what is then taken: `10°, common practice`. */
  readonly optional?: string;
  /** Whether the field is there at all, given the rest of the case. */
  readonly when?: (typed: WorkingCase) => boolean;
}

export interface QuantityField extends FieldBase {
  readonly kind: 'quantity';
  readonly of: Kind;
  /** The unit that the field starts with; any of its kind may be chosen or typed. */
  readonly unit: Unit;
  readonly signed?: true;
  /** A difference, uncertainty or tolerance of a temperature. */
  readonly interval?: true;
}
/** A plain number with what it counts beside it: `°`, `rev/min`, `%`. */
export interface NumberField extends FieldBase {
  readonly kind: 'number';
  readonly counts: string;
  readonly signed?: true;
}
export interface ChoiceField extends FieldBase {
  readonly kind: 'choice';
  readonly choices: readonly { readonly value: string; readonly words: string }[];
  /** What stands chosen while the case says nothing. */
  readonly starts: string;
}
export interface TextField extends FieldBase {
  readonly kind: 'text';
  /** Set in the figures face: codes, orders, formulas. */
  readonly figures?: true;
  /** How its text reads to a person, where it is written in short: `45° to C` for `45:C`. */
  readonly says?: (text: string) => string;
}
export interface MomentField extends FieldBase {
  /** A local date, or a date and time, as `2026-12-01` or `2026-12-01T14:00`. */
  readonly kind: 'date' | 'moment';
}
/** An angle that is turned by slider, keys or typing. */
export interface TurnField extends FieldBase {
  readonly kind: 'turn';
  /** Degrees, both included; it goes round. */
  readonly from: number;
  readonly to: number;
}
export type CellField = QuantityField | NumberField | ChoiceField | TextField | MomentField;
/** A list of like rows; `name.0.column` is a cell's path in errors. */
export interface RowsField extends FieldBase {
  readonly kind: 'rows';
  readonly columns: readonly CellField[];
  /** What one row is called: `reading`. */
  readonly row: string;
  readonly least: number;
  readonly most: number;
}
export type WorkingField = CellField | TurnField | RowsField;

export interface FieldSection {
  readonly heading: string;
  readonly fields: readonly WorkingField[];
}

export type AnswerPart =
  | {
      readonly kind: 'judgement';
      readonly of?: string;
      readonly verdict: Verdict;
      /** Said in place of the verdict's own word: `Order worked out`. */
      readonly word?: string;
      /** Nothing failed, it is too early: shown with the waiting sign and, without `word`, the word Waiting. */
      readonly waits?: true;
      readonly reason: string;
    }
  | {
      readonly kind: 'facts';
      readonly heading?: string;
      /** Values printed, with their unit: `32.7 N·m`. */
      readonly facts: readonly { readonly name: string; readonly value: string; readonly note?: string }[];
    }
  | {
      readonly kind: 'table';
      readonly heading: string;
      readonly columns: readonly { readonly name: string; readonly figures?: true }[];
      readonly rows: readonly (readonly string[])[];
    }
  | { readonly kind: 'steps'; readonly heading: string; readonly steps: readonly string[] }
  | { readonly kind: 'drawing'; readonly caption: string; readonly drawing: Drawing };

/** What a working answers to a case. With errors or something missing there may still be parts that hold. */
export interface WorkingAnswer {
  /** By field path: what is wrong and what would be right. */
  readonly errors: Readonly<Record<string, string>>;
  /** What is still to be typed before there is an answer, in a sentence; null when it is all there. */
  readonly missing: string | null;
  readonly parts: readonly AnswerPart[];
  /** What was taken because nothing was typed, and what the formula leaves out. */
  readonly assumed: readonly string[];
  readonly cautions: readonly string[];
  /** Formula and source with edition and section, one line each. */
  readonly basis: readonly string[];
}

export interface WorkingOptions {
  readonly dialect: 'british' | 'american';
}

/** One working: its fields, its answer, and what of a spec it can start from. */
export interface Working {
  readonly key: string;
  readonly group: WorkingGroup;
  readonly title: string;
  /** The question that it answers, in one sentence of a builder. */
  readonly asks: string;
  readonly sections: readonly FieldSection[];
  /** A worked example from print, which an empty page offers. */
  readonly example: { readonly typed: WorkingCase; readonly from: string };
  /** The cases that a spec gives, such as one a fastener group. */
  readonly fromSpec?: (
    document: SpecDocument,
  ) => readonly { readonly name: string; readonly typed: WorkingCase }[];
  readonly workOut: (typed: WorkingCase, options: WorkingOptions) => WorkingAnswer;
}
