import type { SheetState, SignatureMeaning, StepStatus } from '../contracts/sheets.js';
import type { SecondCheckKind, StepKind } from '../contracts/steps.js';
import type { Verdict } from '../contracts/verdict.js';

/** The words for everything that has a name in code, in one place for page, mail and paper. */
export const sheetStateWords: Record<SheetState, string> = {
  planned: 'planned',
  'on-the-stand': 'on the stand',
  countersigning: 'countersigning',
  'signed-off': 'signed off',
  released: 'released',
};

export const stepKindWords: Record<StepKind, string> = {
  check: 'check',
  measurement: 'measurement',
  tightening: 'tightening',
  wiring: 'wiring',
  'valve-timing': 'valve timing',
  photo: 'photo',
};

export const stepStatusWords: Record<StepStatus, string> = {
  waiting: 'waiting',
  open: 'open',
  'in-hand': 'in hand',
  'to-countersign': 'to countersign',
  snag: '{snag}',
  done: 'done',
};

export const secondCheckWords: Record<SecondCheckKind, string> = {
  'measured-again': 'measured again',
  'strip-read-again': 'strip read again',
  'read-again': 'read again',
  'setting-and-pull-witnessed': 'setting and pull witnessed',
  inspected: 'inspected',
};

export const verdictWords: Record<Verdict, string> = {
  pass: 'Pass',
  fail: 'Fail',
  doubtful: 'Doubtful',
  'not-judged': 'Not judged',
};

export const signatureWords: Record<SignatureMeaning, string> = {
  built: 'Builder',
  countersigned: 'Countersigner',
  released: 'Released by the foreman',
};
