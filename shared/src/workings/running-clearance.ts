import { runningClearance } from '../measuring/running-clearance.js';
import { defineWorking, type WorkedOut } from './define-working.js';
import {
  limitFields,
  limitPaths,
  roundColumns,
  roundPaths,
  roundRows,
  uncertaintyField,
} from './measuring/fields.js';
import { bandPart, limitsIf, limitsOf, onePlace, printSize, roundOf } from './measuring/figures.js';
import { casesOfMeasurements } from './measuring/from-spec.js';
import { writeRows } from './rows.js';

const places: ReadonlySet<string> = new Set(['mains', 'big-ends', 'pistons', 'cam', 'valves']);

/** The clearance of a shaft in its hole, or a piston in its bore, from what was measured of both. */
export const runningClearanceWorking = defineWorking({
  key: 'running-clearance',
  group: 'measuring',
  title: 'Running clearance',
  asks: 'How much clearance has the shaft in its bearing, or the piston in its bore?',
  sections: [
    {
      heading: 'The hole',
      fields: [
        roundRows('hole', 'Readings of the hole', onePlace),
        {
          kind: 'text',
          name: 'splitAxis',
          label: 'Axis at the split of shells',
          hint: 'as it is called in the readings; those are left out',
          optional: 'no split: every reading counts',
        },
      ],
    },
    { heading: 'The shaft', fields: [roundRows('shaft', 'Readings of the shaft', onePlace)] },
    {
      heading: 'The limits',
      fields: [
        ...limitFields({ of: 'length', unit: 'mm', low: 'Least clearance', high: 'Most clearance' }),
        uncertaintyField('length', 'mm'),
      ],
    },
  ],
  example: {
    typed: {
      hole: writeRows(
        [
          { height: 'front', axis: 'upright', value: '2.0018 in' },
          { height: 'rear', axis: 'upright', value: '2.0019 in' },
        ],
        roundColumns,
      ),
      shaft: writeRows([{ height: 'middle', axis: 'upright', value: '2.0000 in' }], roundColumns),
      low: '0.0015 in',
      high: '0.0020 in',
    },
    from: 'limits of a bearing maker’s bulletin, 0.00075 to 0.0010 in for each inch of shaft: 0.0015 to 0.0020 in for 2.000 in; readings made up to it',
  },
  basis: [
    'Least = smallest hole − largest shaft; most = largest hole − smallest shaft. The definition of clearance.',
    'A clearance takes two readings, and so √2 of what the tool may be out.',
  ],
  fieldOf: [...roundPaths('hole', 'hole'), ...roundPaths('shaft', 'shaft'), ...limitPaths],
  fromSpec: (document) =>
    casesOfMeasurements(document, ({ place, name }) => places.has(place) && /clearance/i.test(name)),
  answer: (read, options): WorkedOut => {
    const uncertainty = read.quantityIf('uncertainty');
    const answer = runningClearance({
      hole: roundOf(read, 'hole'),
      shaft: roundOf(read, 'shaft'),
      splitAxis: read.textIf('splitAxis'),
      ...limitsIf(read),
      uncertainty,
    });
    const { verdict, reason, least, mean, most, cautions } = answer;
    const both = uncertainty && { ...uncertainty, value: uncertainty.value * Math.SQRT2 };
    return {
      parts: [
        { kind: 'judgement', verdict, reason },
        {
          kind: 'facts',
          heading: 'Clearance',
          facts: [
            { name: 'Least', value: printSize(least) },
            { name: 'Mean', value: printSize(mean) },
            { name: 'Most', value: printSize(most) },
          ],
        },
        ...bandPart(
          'The tightest and the loosest place on the band',
          limitsOf(read),
          [
            { value: least, uncertainty: both, label: 'tightest' },
            { value: most, uncertainty: both, label: 'loosest' },
          ],
          options,
        ),
      ],
      assumed: [
        ...(uncertainty === undefined ? ['The tools are taken to be right.'] : []),
        'Both parts were measured at one temperature, near 20 °C. Hot, an aluminium housing opens and a piston closes the clearance.',
      ],
      cautions,
    };
  },
});
