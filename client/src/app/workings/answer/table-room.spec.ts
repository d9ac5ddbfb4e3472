import { describe, expect, it } from 'vitest';
import { isTooWide } from './table-room';

const figures = (name: string) => ({ name, figures: true as const });

describe('the room that a table has on a phone', () => {
  it('is enough for a few short columns, and for words that break', () => {
    const rows = [['1', 'snug, all of them by hand', '20 N·m']];
    expect(isTooWide({ columns: [figures('Pass'), { name: 'What' }, figures('Each to')], rows })).toBe(false);
  });

  it('is not enough for six columns of figures', () => {
    const columns = ['Crank', 'Cylinder', 'Stroke', 'Inlet', 'Exhaust', 'Below top'].map(figures);
    expect(isTooWide({ columns, rows: [['120°', '1', 'power', 'shut', 'open', '71.3 mm']] })).toBe(true);
  });

  it('is not enough for figures that may not be parted', () => {
    const columns = [figures('Pass'), figures('Each to'), figures('Between')];
    expect(isTooWide({ columns, rows: [['1', '73 N·m', '69 N·m to 77 N·m, 51 lbf·ft to 57 lbf·ft']] })).toBe(
      true,
    );
  });
});
