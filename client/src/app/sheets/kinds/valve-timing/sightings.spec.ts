import { describe, expect, it } from 'vitest';
import { judgeTdc } from '@second-spanner/shared/sheet/judge-tdc';
import { whichTdcStep } from '../../testing/steps';
import {
  emptySightings,
  isSightingsDraft,
  readSightings,
  withNewPosition,
  withNewRow,
  withoutRow,
  withRow,
} from './sightings';

const order = whichTdcStep.firingOrder;

describe('sightings as they are entered', () => {
  it('begin with the cylinder asked about and nothing seen', () => {
    const draft = emptySightings(1);
    expect(draft.positions).toHaveLength(1);
    expect(readSightings(draft, order)).toBeNull();
  });

  it('are judged as soon as something is seen at every position', () => {
    const seen = withRow(emptySightings(1), 0, 0, { piston: 'top' });
    expect(readSightings(seen, order)).toEqual({ sightings: [[{ cylinder: 1, piston: 'top' }]] });
    expect(readSightings(withNewPosition(seen, 1), order)).toBeNull();
  });

  it('tell compression TDC when the companion’s valves rock', () => {
    // With 1-3-4-2 cylinder 4 is No. 1's companion: its valves rock when No. 1 is at compression TDC. Common practice,
    // no source.
    const draft = withRow(withNewRow(withRow(emptySightings(1), 0, 0, { piston: 'top' }), 0, order), 0, 1, {
      cylinder: '4',
      rocking: true,
    });
    const seen = readSightings(draft, order);
    expect(seen && judgeTdc(whichTdcStep, seen).verdict).toBe('pass');
  });

  it('leave out a row in which nothing was seen', () => {
    const draft = withNewRow(withRow(emptySightings(1), 0, 0, { inlet: 'shut' }), 0, order);
    expect(draft.positions[0]?.map(({ cylinder }) => cylinder)).toEqual(['1', '3']);
    expect(readSightings(draft, order)?.sightings).toEqual([[{ cylinder: 1, inlet: 'shut' }]]);
  });

  it('lose a position with its last row, but never all', () => {
    const two = { ...withNewPosition(emptySightings(1), 1), about: 1 };
    expect(withoutRow(two, 1, 0)).toEqual({ ...emptySightings(1), about: -1 });
    expect(withoutRow(emptySightings(1), 0, 0)).toEqual(emptySightings(1));
  });

  it('ask about the last position unless another is named', () => {
    const two = withRow(withNewPosition(withRow(emptySightings(1), 0, 0, { piston: 'top' }), 1), 1, 0, {
      exhaust: 'opening',
    });
    expect(readSightings(two, order)).not.toHaveProperty('about');
    expect(readSightings({ ...two, about: 0 }, order)?.about).toBe(0);
  });

  it('are told from a draft of another shape', () => {
    expect(isSightingsDraft(emptySightings(1))).toBe(true);
    expect(isSightingsDraft({ positions: 'none', about: 0 })).toBe(false);
  });
});
