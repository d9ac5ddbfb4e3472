import type { KeySpec, Limits, Sourced } from '../../contracts/spec.js';
import { printLimits } from '../../spec/print-limits.js';
import { inspection, reading, type Draft } from './draft.js';

const widths = [
  { size: 'keyWidth', what: 'width of the key', at: 'Middle of the key' },
  { size: 'shaftKeywayWidth', what: 'keyway in the shaft', at: 'Keyway, middle' },
  { size: 'hubKeywayWidth', what: 'keyway in the pulley', at: 'Keyway, middle' },
  { size: 'shaftDiameter', what: 'shaft', at: 'Beside the keyway' },
  { size: 'hubBore', what: 'bore of the pulley', at: 'Across the keyway' },
] as const satisfies readonly { size: keyof KeySpec; what: string; at: string }[];

/** A key's sizes, and the look that says it fits: neither falls out nor holds the pulley off. */
export function sizesOfKey(spec: KeySpec): readonly Draft[] {
  const size = (limits: Sourced<Limits>, what: string, at: string) =>
    reading(
      {
        key: `${spec.key}:${what.replaceAll(' ', '-')}`,
        place: 'pulley',
        name: `${spec.name}: ${what}`,
        method: what.startsWith('bore') ? 'bore-gauge' : 'micrometer',
        limits,
        at: [at],
        critical: false,
      },
      {},
    );
  const depths = `keyway ${printLimits(spec.shaftKeywayDepth.value)} deep in the shaft and ${printLimits(spec.hubKeywayDepth.value)} in the pulley, key ${printLimits(spec.keyHeight.value)} high`;
  return [
    ...widths.map(({ size: name, what, at }) => size(spec[name], what, at)),
    inspection({
      id: `key:${spec.key}`,
      after: [`read:pulley:${spec.key}`],
      title: `${spec.name} and pulley tried on the shaft`,
      instruction: `Key by hand into the shaft, pulley over it: it must not fall out, rock, or touch at the top (${depths}).`,
      lookFor: [
        'Key stays in the shaft when it is turned over',
        'Pulley slides on without rock and reaches its shoulder',
        'Room over the top of the key',
      ],
    }),
  ];
}
