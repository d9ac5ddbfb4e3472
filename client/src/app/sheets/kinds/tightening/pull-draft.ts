import { hasTexts } from '../../drafts/draft';
import { noAdapter, type AdapterDraft } from './adapter-fields';

/** A pull as it is being typed. The wrench's setting stays for the pass, a reading belongs to its fastener alone. */
export interface PullDraft {
  readonly pass: string;
  readonly setting: string;
  readonly slot: string;
  readonly reading: string;
  readonly adapter: AdapterDraft;
}

export const noPull: PullDraft = { pass: '', setting: '', slot: '', reading: '', adapter: noAdapter };

export function isPullDraft(value: unknown): value is PullDraft {
  if (!hasTexts(value, ['pass', 'setting', 'slot', 'reading'])) return false;
  const adapter: unknown = 'adapter' in value ? value.adapter : null;
  return hasTexts(adapter, ['length', 'angle']) && 'isOn' in adapter && typeof adapter.isOn === 'boolean';
}
