import { hasTexts } from '../../drafts/draft';
import { isReadingDraft, noReading, type ReadingDraft } from '../measurement/reading-draft';
import { noAdapter, type AdapterDraft } from './adapter-fields';

/** A pull as it is being typed. The wrench's setting stays for the pass, a reading belongs to its fastener alone. */
export interface PullDraft {
  readonly pass: string;
  readonly setting: string;
  readonly readings: ReadingDraft;
  readonly adapter: AdapterDraft;
}

export const noPull: PullDraft = { pass: '', setting: '', readings: noReading, adapter: noAdapter };

export function isPullDraft(value: unknown): value is PullDraft {
  if (!hasTexts(value, ['pass', 'setting']) || !('readings' in value)) return false;
  if (!isReadingDraft(value.readings)) return false;
  const adapter: unknown = 'adapter' in value ? value.adapter : null;
  return hasTexts(adapter, ['length', 'angle']) && 'isOn' in adapter && typeof adapter.isOn === 'boolean';
}
