import { describe, expect, it } from 'vitest';
import at18 from '../../../test-data/specs/ok/at18.json' with { type: 'json' };
import bx26 from '../../../test-data/specs/ok/bx26.json' with { type: 'json' };
import cv34 from '../../../test-data/specs/ok/cv34.json' with { type: 'json' };
import { checkSpecDocument } from './check-document.js';
import { countValues, specRows, specSections } from './spec-rows.js';

const document = checkSpecDocument(at18);
const row = (key: string) => specRows(document).find((each) => each.key === key);

describe('the rows of a spec', () => {
  it('prints a torque with its limits, its other figure and its source', () => {
    expect(row('fastenerGroups.head-nuts.torque')).toMatchObject({
      section: 'tightening',
      label: 'Head nuts',
      printed: '73\u2009N·m',
      limits: '69 to 77\u2009N·m',
      alsoPrinted: '54\u2009lbf·ft',
      sourceText: 'Workshop manual 3rd ed., p. 4-17',
    });
  });

  it('prints two limits to the same decimals', () => {
    expect(row('ignition.pointsGap')?.printed).toBe('0.35 to 0.40\u2009mm');
  });

  it('says which kind of source a value has, and when it has none', () => {
    expect(row('engine.rodLength')?.sourceText).toBe('Measured by T. Brandt');
    expect(row('ignition.plugGap')?.sourceText).toBe("Maker's data sheet: Plug maker's chart");
    expect(row('fastenerGroups.crank-pulley-bolt.torque')?.sourceText).toBe('Common practice');
    expect(row('measurements.pump-pulley-behind')?.sourceText).toBe('No source');
  });

  it('keeps the name of a group as a trade word, with its capital', () => {
    expect(row('fastenerGroups.big-end-nuts.torque')?.label).toBe('{Big-end} nuts');
  });

  it('names each side of TDC in words', () => {
    expect(row('valveTrain.timing.ivo')?.printed).toBe('16° before TDC');
    expect(row('valveTrain.timing.evc')?.printed).toBe('21° after TDC');
  });

  it('gives every row a key of its own and a section in the order shown', () => {
    const rows = specRows(document);
    expect(new Set(rows.map(({ key }) => key)).size).toBe(rows.length);
    const order = specSections.map(({ key }) => key as string);
    const positions = rows.map(({ section }) => order.indexOf(section));
    expect(positions).toEqual([...positions].sort((a, b) => a - b));
  });
});

describe('the demo specs', () => {
  it.each([
    { name: 'AT18', input: at18 as unknown },
    { name: 'BX26', input: bx26 },
    { name: 'CV34', input: cv34 },
  ])('$name holds at least 120 values', ({ input }) => {
    expect(countValues(checkSpecDocument(input))).toBeGreaterThanOrEqual(120);
  });
});
