import type { CylinderTest } from '../contracts/measuring.js';
import { printNumber } from '../quantities/print.js';
import type { CylinderRead, CylinderTestKind } from './cylinder-readings.js';

type Finding = CylinderTest['findings'][number];

/** Oil that changes a reading by less than this share of it has sealed nothing. Common practice, no source. */
const oilTells = 0.1;

export interface FindingInput {
  readonly test: CylinderTestKind;
  /** In the order they stand. */
  readonly cylinders: readonly CylinderRead[];
  readonly isLow: (cylinder: CylinderRead) => boolean;
  readonly print: (value: number) => string;
}

/** What the readings point at: cylinders that are low, low neighbours, and what oil did to the low ones. */
export function cylinderFindings(input: FindingInput): readonly Finding[] {
  const low = input.cylinders.filter(input.isLow);
  return [
    ...low.map((one) => lowFinding(one, input)),
    ...neighbours(input).map(neighbourFinding),
    ...low.flatMap((one) => wetFinding(one, input)),
  ];
}

function lowFinding({ cylinder, dry }: CylinderRead, { test, print }: FindingInput): Finding {
  const said = test === 'compression' ? `reads ${print(dry)}` : `loses ${print(dry)}`;
  return { cylinders: [cylinder], finding: 'low', reason: `Cylinder ${cylinder} ${said}.` };
}

/** Pairs of low cylinders that stand side by side in one bank. */
function neighbours({ cylinders, isLow }: FindingInput): readonly (readonly [CylinderRead, CylinderRead])[] {
  return cylinders.flatMap((one, i) => {
    const next = cylinders[i + 1];
    return next !== undefined && next.bank === one.bank && isLow(one) && isLow(next) ? [[one, next]] : [];
  });
}

const neighbourFinding = ([a, b]: readonly [CylinderRead, CylinderRead]): Finding => ({
  cylinders: [a.cylinder, b.cylinder],
  finding: 'neighbours-low',
  reason: `Cylinders ${a.cylinder} and ${b.cylinder} stand side by side and are both low: the gasket may have gone between them, or the head lifts there.`,
});

function wetFinding({ cylinder, dry, wet }: CylinderRead, { test, print }: FindingInput): readonly Finding[] {
  if (wet === undefined) return [];
  const better = test === 'compression' ? wet - dry : dry - wet;
  const share = dry === 0 ? (better > 0 ? 1 : 0) : better / dry;
  const change = `${print(dry)} dry, ${print(wet)} with oil`;
  const seals = share >= oilTells - 1e-9;
  return [
    {
      cylinders: [cylinder],
      finding: seals ? 'rises-wet' : 'stays-low-wet',
      reason: seals
        ? `Cylinder ${cylinder}, ${change}: oil seals it, which points at rings, bore or piston.`
        : `Cylinder ${cylinder}, ${change}: oil changes it by less than ${printNumber(100 * oilTells, 0)} %, which points at valves, their seats or the gasket.`,
    },
  ];
}
