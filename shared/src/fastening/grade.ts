import { requireText } from '../quantities/require.js';
import { clip } from '../quantities/clip.js';
import { proofStresses, type ProofStress } from './tables/proof-stress.js';
import { inch, type Thread } from './thread.js';

/** A grade with its proof stress at a size, or why it has none. */
export type Grade =
  | {
      readonly name: string;
      /** Pa. */
      readonly proof: number;
      /** Where the standard of the grade is written for other threads than this one. */
      readonly note?: string;
    }
  | { readonly why: string };

/** Exact: 1 ksi is 1000 psi (NIST SP 811, appendix B.8). */
const ksi = 8_896_443_230_521 / 1_290_320;
const megapascal = 1e6;

/**
 * The proof stress of a property class or grade at the size of a thread: `8.8`, `class 10.9`, `SAE 5`, `grade 8`.
 * A grade that no table has, or not at this size, is no error: the answer says why it can't be judged.
 *
 * @throws InputError on `grade` where it is no text
 */
export function gradeAt(input: unknown, thread: Thread): Grade {
  const text = requireText(input, 'grade', { max: 40 }).trim();
  if (text.toLowerCase() === 'unknown') return { why: 'the grade of the fastener is not known' };
  const stress = proofStresses.find(({ name }) => name === canonical(text));
  if (stress === undefined) {
    return { why: `“${clip(text)}” is not in the tables of property classes (ISO 898-1) and SAE grades` };
  }
  const isIso = stress.standard === 'ISO 898-1';
  const size = thread.diameter / (isIso ? 0.001 : inch);
  const band = size < stress.from - 1e-6 ? undefined : stress.bands.find(({ to }) => size <= to + 1e-6);
  if (band === undefined) {
    return { why: `${stress.standard} gives no proof stress of ${stress.name} at ${thread.name}` };
  }
  return {
    name: stress.name,
    proof: band.proof * (isIso ? megapascal : ksi),
    ...noteOf(stress, thread),
  };
}

function canonical(text: string): string {
  const words = text.toLowerCase().replace(/\s+/g, ' ');
  const iso = /^(?:iso |property )?(?:class )?(\d{1,2}\.\d)$/.exec(words)?.[1];
  if (iso !== undefined) return iso;
  const sae = /^(?:sae ?)?(?:j429 )?(?:grade |gr\.? ?)?(\d)$/.exec(words)?.[1];
  return sae === undefined ? text : `SAE ${sae}`;
}

function noteOf({ name, standard }: ProofStress, { series }: Thread): { note?: string } {
  const written = standard === 'ISO 898-1' ? ['metric-coarse', 'metric-fine'] : ['UNC', 'UNF'];
  const threads = standard === 'ISO 898-1' ? 'metric' : 'Unified';
  if (written.includes(series)) return {};
  return { note: `${standard} is written for ${threads} threads; its proof stress of ${name} is taken.` };
}
