import type { Rotation, Side } from '../../contracts/calculations.js';

/** What is typed about an engine's cap and its leads: texts as they were typed, until they are read. */
export interface WiringForm {
  /** Code and edition of the spec that the engine was taken from; empty for one typed in. */
  readonly spec: string;
  readonly edition: string;
  readonly cylinders: string;
  /** As the trade writes it: `1-3-4-2`. */
  readonly order: string;
  readonly turns: Rotation | '';
  readonly seenFrom: Side;
  readonly spacing: 'even' | 'typed';
  /** Where the first of evenly spaced posts stands, degrees clockwise from the mark. */
  readonly firstAngle: string;
  /** Posts of an uneven cap: `45, 135, 225, 315`. */
  readonly angles: string;
  /** Angle of the post for the first cylinder of the order; empty for the first post of the list. */
  readonly first: string;
  /** Crank degrees from spark to spark of an engine that fires unevenly: `90-150-90-150`; empty when even. */
  readonly intervals: string;
  readonly outlets: 'own' | 'traced';
  /** By a post's angle: the outlet that it leads to. */
  readonly trace: Readonly<Record<string, string>>;
  /** By a post's angle: the outlet beside it, where that is not the one in order of name. */
  readonly beside: Readonly<Record<string, string>>;
  /** Crank degrees before TDC. */
  readonly advance: string;
  readonly ivo: string;
  readonly ivc: string;
  readonly evo: string;
  readonly evc: string;
  /** By outlet (its letter on a traced cap, else its post's angle): the cylinder whose lead is there. */
  readonly fitted: Readonly<Record<string, string>>;
}

export const blankForm: WiringForm = {
  spec: '',
  edition: '',
  cylinders: '4',
  order: '',
  turns: '',
  seenFrom: 'cap',
  spacing: 'even',
  firstAngle: '0',
  angles: '',
  first: '',
  intervals: '',
  outlets: 'own',
  trace: {},
  beside: {},
  advance: '10',
  ivo: '',
  ivc: '',
  evo: '',
  evc: '',
  fitted: {},
};

export type FormField = keyof WiringForm;

/** What is wrong, by the field where it is said. */
export type FormErrors = Readonly<Partial<Record<FormField, string>>>;

export const valveFields = ['ivo', 'ivc', 'evo', 'evc'] as const satisfies readonly FormField[];

/** Whether two forms describe one engine, whatever is fitted to it. */
export function isSameEngine(one: WiringForm, other: WiringForm): boolean {
  const engine = (form: WiringForm): string => JSON.stringify({ ...form, spec: '', edition: '', fitted: {} });
  return engine(one) === engine(other);
}
