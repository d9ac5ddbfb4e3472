import type { BenchItem } from '@second-spanner/shared/contracts/sheets';
import type { SignName } from '../verdict/signs';

/** How an item of the bench is said: its sign and word, what to press, and where that leads. */
export interface BenchWords {
  readonly sign: SignName;
  readonly word: string;
  /** May hold trade-word tokens. */
  readonly act: string;
}

const words: Readonly<Record<Exclude<BenchItem['kind'], 'second-check'>, BenchWords>> = {
  snag: { sign: 'fail', word: '{Snag}', act: 'Settle the {snag}' },
  'next-step': { sign: 'waiting', word: 'Next step', act: 'Open the step' },
  sign: { sign: 'hold', word: 'To sign', act: 'Read and sign' },
  release: { sign: 'hold', word: 'To release', act: 'Read and release' },
  read: { sign: 'pass', word: 'Released', act: 'Read the sheet' },
};

export function benchWords(item: BenchItem): BenchWords {
  if (item.kind !== 'second-check') {
    const isOfSheet = item.kind === 'next-step' && item.stepCode === null;
    return isOfSheet ? { ...words['next-step'], word: 'Planned', act: 'Open the sheet' } : words[item.kind];
  }
  return { sign: 'hold', word: 'Hold', act: secondCheckAct(item) };
}

function secondCheckAct({ stepKind }: BenchItem): string {
  if (stepKind === 'measurement') return 'Measure it again';
  if (stepKind === 'tightening') return 'Go and see it';
  return stepKind === 'wiring' || stepKind === 'valve-timing' ? 'Read it again' : 'Inspect it';
}

/** The address of what an item asks for. */
export function benchLink({ kind, sheetId, stepCode }: BenchItem): readonly string[] {
  const sheet = ['/sheets', sheetId];
  if (stepCode !== null) {
    return [...sheet, 'steps', stepCode, ...(kind === 'second-check' ? ['second'] : [])];
  }
  return kind === 'sign' || kind === 'release' ? [...sheet, 'sign-off'] : sheet;
}

/** Whether an item's step is something that has a shape. */
export function hasDrawing({ stepKind }: BenchItem): boolean {
  return stepKind !== null && stepKind !== 'check' && stepKind !== 'photo';
}
