import { causeTitles, swapLines } from '../../sheets/kinds/wiring/diagnosis-words';
import { signOf, signWords } from '../../verdict/signs';
import { companionWords, intervalWords, leadRows, type LeadRow } from './map-words';
import { spoken } from './spoken';
import type { WiringAnswer } from './work-out';

/** The whole answer as plain text, to be sent or kept. Holds trade-word tokens. Empty while there is no map. */
export function caseText(answer: WiringAnswer, engine: string, address: string): string {
  const { map, cap } = answer;
  if (map === null || cap === null) return '';
  const companions = companionWords(map);
  return [
    `Wiring map, ${engine}`,
    `Firing order ${cap.firingOrder.join('-')}`,
    spoken(map.reason),
    `Sparks: ${intervalWords(map)}.`,
    ...(companions === null ? [] : [`Companions, whose pistons rise together: ${companions}.`]),
    '',
    ...leadRows(map, answer.diagnosis).map((row) => rowText(row)),
    ...diagnosisText(answer),
    '',
    address,
  ].join('\n');
}

function rowText({ post, outlet, cylinder, fitted }: LeadRow): string {
  const place = outlet === post ? `Post ${post}` : `Post ${post}, {outlet} ${outlet}`;
  if (fitted === null) return `${place}: cylinder ${cylinder}`;
  const state = fitted.right ? 'right' : `wrong, ${fitted.spark}; valves then: ${fitted.valves}`;
  return `${place}: should be ${cylinder}, fitted ${fitted.cylinder}, ${state}`;
}

function diagnosisText({ diagnosis, fitted }: WiringAnswer): readonly string[] {
  if (diagnosis === null || fitted === null) return [];
  const also = diagnosis.alsoFits.map((cause) => causeTitles[cause]).join(', ');
  return [
    '',
    `${signWords[signOf(diagnosis.verdict)]}: ${causeTitles[diagnosis.cause]}`,
    spoken(diagnosis.reason),
    ...swapLines(fitted, diagnosis.swaps).map((line, i) => `${i + 1}. ${line}`),
    ...(also === '' ? [] : [`It also fits: ${also}. The cure is the same.`]),
    ...diagnosis.cautions.map((caution) => `Take care: ${spoken(caution)}`),
  ];
}
