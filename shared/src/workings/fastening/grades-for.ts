import type { TorqueDoubt, TorqueDoubtRequest } from '../../contracts/fastening.js';
import { readThread } from '../../fastening/read-thread.js';
import { torqueDoubt } from '../../fastening/torque-doubt.js';
import type { AnswerPart } from '../working.js';
import { percent } from './figures.js';

const unifiedGrades = ['SAE 2', 'SAE 5', 'SAE 8'] as const;
const metricClasses = ['8.8', '10.9', '12.9'] as const;

const meanings = {
  pass: 'believable',
  fail: 'over its proof load: it would stretch and stay stretched',
  'not-judged': 'no proof stress for this size',
} as const;

/** A row a common grade of the thread's kind, for a bolt whose own grade is not known: what the torque is to each. */
export function gradesFor(
  request: TorqueDoubtRequest,
  { preload, shareOfProof }: TorqueDoubt,
): readonly AnswerPart[] {
  if (preload === null || shareOfProof !== null) return [];
  const isMetric = readThread(request.thread).series.startsWith('metric');
  const rows = (isMetric ? metricClasses : unifiedGrades).map((grade) => {
    const { verdict, shareOfProof: share } = torqueDoubt({
      torque: request.torque,
      thread: request.thread,
      condition: request.condition,
      nutFactorSpread: request.nutFactorSpread,
      grade,
    });
    return [
      isMetric ? `class ${grade}` : `SAE grade ${grade.slice(-1)}`,
      share === null ? '–' : percent(share),
      verdict === 'doubtful' ? doubt(share ?? 0) : meanings[verdict],
    ];
  });
  return [
    {
      kind: 'table',
      heading: 'If it were of a common grade',
      columns: [{ name: 'Grade' }, { name: 'Of its proof load', figures: true }, { name: 'Which is' }],
      rows,
    },
  ];
}

const doubt = (share: number): string =>
  share > 0.5
    ? 'close to its proof load: look at the figure again'
    : 'little: looser than most joints are made';
