import type { StepDetail } from '@second-spanner/shared/contracts/sheets';
import { secondCheckWords } from '@second-spanner/shared/sheet/words';
import { stamp } from '../../paper/stamp.js';
import { initialled, type Wording } from '../words.js';

const settlementWords = {
  redone: 'redone',
  replaced: 'replaced',
  'accepted-as-it-is': 'accepted as it is',
} as const;

/** What is told under a step in small print: corrections, the second check, snags, and why it was unmarked. */
export function notes(step: StepDetail, words: Wording): readonly string[] {
  if (step.covered) return ['The first reading is covered until the second is in.'];
  return [
    ...corrections(step, words),
    ...remarks(step),
    ...secondCheck(step, words),
    ...snags(step),
    ...unmarked(step),
  ].map((note) => words.say(note));
}

function corrections({ entries }: StepDetail, words: Wording): readonly string[] {
  return entries
    .filter(({ replaces }) => replaces !== null)
    .map((entry) => {
      const old = entries.find(({ id }) => id === entry.replaces);
      const what = old ? `${placeOf(old.content)}${words.read(old.content)}` : 'an entry';
      return `${what} replaced by ${words.read(entry.content)}, ${entry.replaceReason ?? ''} (${initialled(entry.by.name)}, ${stamp(entry.at)}).`;
    });
}

type Content = StepDetail['entries'][number]['content'];

function placeOf(content: Content): string {
  if (content.kind === 'measurement') return `${content.at}: `;
  if (content.kind === 'tightening') return `Pass ${content.pass}, ${content.fastener}: `;
  return '';
}

/** What was written beside a check, or found at the valves or the leads. */
function remarks({ entries }: StepDetail): readonly string[] {
  return entries
    .filter(({ current }) => current)
    .flatMap(({ content, reason }) => {
      if (content.kind === 'check') return content.note ? [content.note] : [];
      return content.kind === 'valve-timing' ? [reason] : [];
    });
}

function secondCheck(step: StepDetail, words: Wording): readonly string[] {
  return step.countersignatures.map((signed) => {
    const reading = step.secondReadings.find(
      ({ by, round }) => by.id === signed.by.id && round === signed.round,
    );
    const kind = reading ? secondCheckWords[reading.content.kind] : 'second check';
    const by = `${initialled(signed.by.name)}, ${stamp(signed.at)}`;
    if (signed.outcome === 'dispute') return `Disputed by ${by}: ${signed.reason ?? ''}`;
    const pulls =
      signed.pullsWitnessed.length > 0 ? ` Pulls watched: ${signed.pullsWitnessed.join(', ')}.` : '';
    const tool = reading && 'toolId' in reading.content ? ` with ${words.tool(reading.content.toolId)}` : '';
    return `Second person, ${kind}${tool}: ${reading?.agreement.reason ?? ''}${pulls} Countersigned ${by}.`;
  });
}

function snags({ snags: all }: StepDetail): readonly string[] {
  return all.map((snag) => {
    const raised = `{Snag}: ${snag.words} (${initialled(snag.by.name)}, ${stamp(snag.at)})`;
    if (!snag.settled) return `${raised}. Open.`;
    const { how, reason, by, at } = snag.settled;
    return `${raised}. Settled, ${settlementWords[how]}: ${reason} (${initialled(by.name)}, ${stamp(at)}).`;
  });
}

function unmarked({ uncriticalReason }: StepDetail): readonly string[] {
  return uncriticalReason === null ? [] : [`Not treated as critical: ${uncriticalReason}`];
}
