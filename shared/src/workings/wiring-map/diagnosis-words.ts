import type { CapDiagnosis, CylinderSpark, WiringCause } from '../../contracts/calculations.js';

/** The title of a diagnosis. May hold trade-word tokens. */
export const causeTitles: Record<WiringCause, string> = {
  right: 'Wired right',
  'whole-set-moved': 'The whole set is moved round',
  'outlets-read-as-posts': '{Outlets} read as posts',
  'wired-against-the-rotor': 'Wired against the rotor',
  'two-leads-swapped': 'Two {leads} swapped',
  'other-firing-order': 'Another engine’s firing order',
  mixed: 'Several {leads} on the wrong {outlets}',
};

const counts = ['No', 'One', 'Two', 'Three', 'Four', 'Five', 'Six', 'Seven', 'Eight'];

/** The swap plate's caption: `One swap puts it right`. */
export function swapCaption(count: number): string {
  const number = counts[count] ?? String(count);
  return count === 1 ? 'One swap puts it right' : `${number} swaps put it right, in this order`;
}

/** Which cylinder's lead goes from where to where, one line a move, following the swaps in their order. */
export function swapLines(
  fitted: Readonly<Record<string, string | number>>,
  swaps: CapDiagnosis['swaps'],
): readonly string[] {
  const there = { ...fitted };
  return swaps.map(({ outlets: [a, b] }) => {
    const [atA, atB] = [there[a] ?? '', there[b] ?? ''];
    there[a] = atB;
    there[b] = atA;
    return `{Lead} ${atA} to {outlet} ${b}, {lead} ${atB} to {outlet} ${a}`;
  });
}

/** When a cylinder's spark comes as fitted. */
export function sparkWords({ late, stroke }: CylinderSpark): string {
  if (late === 0) return 'on compression';
  const word = stroke === 'inlet' ? '{inlet}' : stroke;
  return `${Math.abs(late)}° ${late > 0 ? 'late' : 'early'}, ${word} stroke`;
}

/** What comes of it. */
export function thenWords({ late, inletOpen, exhaustOpen }: CylinderSpark): string {
  if (late === 0) return 'right';
  if (inletOpen === null || exhaustOpen === null) return 'no power';
  if (inletOpen && exhaustOpen) return 'both valves open';
  if (inletOpen) return '{inlet} open: spits back';
  return exhaustOpen ? 'exhaust open: bangs' : 'both shut: no power';
}
