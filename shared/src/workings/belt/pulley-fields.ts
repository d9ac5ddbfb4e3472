import type { BeltSpec, SpecDocument } from '../../contracts/spec.js';
import type { BeltLengthRequest } from '../../contracts/belt-drive.js';
import { printQuantity } from '../../quantities/print.js';
import type { CaseReader } from '../read-case.js';
import type { FieldSection, QuantityField, WorkingCase } from '../working.js';

const length = (name: string, label: string, hint?: string): QuantityField => ({
  kind: 'quantity',
  name,
  label,
  of: 'length',
  unit: 'mm',
  ...(hint === undefined ? {} : { hint }),
});

/** Two pulleys and their distance, for the workings of an open belt. */
export const pulleySection: FieldSection = {
  heading: 'The pulleys',
  fields: [
    length(
      'driverDiameter',
      'Diameter of the driver',
      'where the belt’s cords run, a little inside its back',
    ),
    length('drivenDiameter', 'Diameter of the driven pulley'),
    length('centres', 'Between their centres'),
  ],
};

export function pulleysOf(read: CaseReader): BeltLengthRequest {
  return {
    driverDiameter: read.quantity('driverDiameter'),
    drivenDiameter: read.quantity('drivenDiameter'),
    centres: read.quantity('centres'),
  };
}

export const pulleyErrors: readonly (readonly [RegExp, string])[] = [
  [/^(driverDiameter|drivenDiameter|centres)\b/, '$1'],
];

/** The spec's belt as one case, with what else of it a working asks for. */
export function beltCase(
  { belt }: SpecDocument,
  more: (belt: BeltSpec) => WorkingCase = () => ({}),
): readonly { readonly name: string; readonly typed: WorkingCase }[] {
  return [
    {
      name: 'The belt',
      typed: {
        driverDiameter: printQuantity(belt.driverDiameter.value),
        drivenDiameter: printQuantity(belt.drivenDiameter.value),
        centres: printQuantity(belt.span.value),
        ...more(belt),
      },
    },
  ];
}
