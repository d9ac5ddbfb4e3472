import { limitDecision } from '../measuring/limit-decision.js';
import { plasticStrip } from '../measuring/plastic-strip.js';
import { roundTo } from '../quantities/round.js';
import { defineWorking, type WorkedOut } from './define-working.js';
import { limitFields } from './measuring/fields.js';
import { bandPart, limitsOf, printSize } from './measuring/figures.js';
import { casesOfMeasurements } from './measuring/from-spec.js';

/** The clearance that a flattened plastic strip shows. */
export const plasticStripWorking = defineWorking({
  key: 'plastic-strip',
  group: 'measuring',
  title: 'Plastic strip',
  asks: 'Which clearance does a plastic strip of this width mean?',
  sections: [
    {
      heading: 'The strip',
      fields: [
        {
          kind: 'quantity',
          name: 'diameter',
          label: 'Diameter of the strip before',
          hint: 'from its packet, or measured',
          of: 'length',
          unit: 'mm',
        },
        {
          kind: 'quantity',
          name: 'width',
          label: 'Width of the flattened strip, at its widest',
          of: 'length',
          unit: 'mm',
        },
      ],
    },
    {
      heading: 'The limits',
      fields: [...limitFields({ of: 'length', unit: 'mm', low: 'Least clearance', high: 'Most clearance' })],
    },
  ],
  example: {
    typed: { diameter: '0.20 mm', width: '0.60 mm' },
    from: 'a strip’s specification, clearance = constant ÷ width: 0.0524 mm for 0.20 mm pressed to 0.60 mm',
  },
  basis: ['π·d²/(4·W), the strip’s volume and length unchanged: a clearance strip’s specification.'],
  fieldOf: [[/^(diameter|width|low|high)/, '$1']],
  fromSpec: (document) => casesOfMeasurements(document, ({ method }) => method === 'plastic-gauge'),
  answer: (read, options): WorkedOut => {
    const { clearance } = plasticStrip({
      diameter: read.quantity('diameter'),
      width: read.quantity('width'),
    });
    const limits = limitsOf(read);
    const value = { ...clearance, value: roundTo(clearance.value, 9) };
    const { verdict, reason } = limitDecision({ value, ...limits });
    const hasLimits = limits.low !== undefined || limits.high !== undefined;
    return {
      parts: [
        ...(hasLimits ? [{ kind: 'judgement', verdict, reason } as const] : []),
        { kind: 'facts', facts: [{ name: 'Clearance', value: printSize(clearance) }] },
        {
          kind: 'steps',
          heading: 'How to read it',
          steps: [
            'Wipe oil off, lay the strip along the journal away from the oil hole, and torque the cap without turning the crank.',
            'Take the cap off and hold the packet’s scale against the strip. That scale counts; this working only checks it.',
            'A strip wider at one end shows taper. Clean every trace of it off.',
          ],
        },
        ...bandPart('The clearance on its band', limits, [{ value, label: 'clearance' }], options),
      ],
      assumed: [
        'The strip kept its length, and its edges are square. In truth they bulge, so the scale on the packet wins.',
        'A strip is good to about a tenth of what it shows (common practice, no source): that is not taken into account.',
      ],
    };
  },
});
