import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import { begunFromLength } from '@second-spanner/shared/workings/working';
import { editionName } from './spec-editions';

/** What a case was begun from, as it stands in the case: an edition and which of its cases. */
export interface Begun {
  /** As it is named in a choice: `AT18,2`. */
  readonly edition: string;
  readonly of: string;
}

/** `AT18, edition 2: head nuts`, from the name of the edition in a choice and that of the case. */
export function sayBegun(edition: string, of: string): string {
  const [code = '', number = ''] = edition.split(',');
  return `${code}, edition ${number}: ${of}`.slice(0, begunFromLength);
}

/** The other way round; null where the text says no edition. */
export function readBegun(text: string): Begun | null {
  const [, code = '', number = '', of = ''] = /^([^,]+), edition (\d+): (.*)$/.exec(text) ?? [];
  return code === '' ? null : { edition: editionName(code, number), of };
}

/** Whether a case of a spec is the one that was begun from, in whoever's words it was said. */
export function isBegun({ edition, of }: Begun, name: string): boolean {
  const said = (words: string): boolean => sayBegun(edition, words) === sayBegun(edition, of);
  return said(tradeText(name, 'british')) || said(tradeText(name, 'american'));
}
