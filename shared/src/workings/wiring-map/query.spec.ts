import { describe, expect, it } from 'vitest';
import { fromQuery, toQuery } from './query.js';
import { blankForm, type WiringForm } from './wiring-form.js';

const through = (form: WiringForm): WiringForm => {
  const query = toQuery(form);
  return fromQuery((name) => (query[name] as string | null | undefined) ?? null);
};

const traced: WiringForm = {
  ...blankForm,
  spec: 'AT18',
  edition: '2',
  order: '1-3-4-2',
  turns: 'anticlockwise',
  seenFrom: 'drive',
  spacing: 'typed',
  angles: '45, 135, 225, 315',
  first: '315',
  outlets: 'traced',
  trace: { '45': 'C', '135': 'D', '225': 'A', '315': 'B' },
  ivo: '16',
  ivc: '56',
  evo: '51',
  evc: '-4',
  fitted: { A: '1', B: '3' },
};

describe('a case in the address', () => {
  it('opens again as it was left', () => {
    expect(through(traced)).toEqual(traced);
  });

  it('keeps what is wrong as it was typed', () => {
    const wrong = { ...blankForm, cylinders: 'four', order: '1-3-x', firstAngle: 'left', intervals: '90-' };
    expect(through(wrong)).toEqual(wrong);
  });

  it('can be read', () => {
    expect(toQuery(traced)).toMatchObject({
      order: '1-3-4-2',
      turns: 'anticlockwise',
      first: '315',
      valves: '16_56_51_-4',
      fitted: 'A:1,B:3',
    });
  });

  it('is a blank page without parameters, with nothing fitted', () => {
    expect(fromQuery(() => null)).toEqual(blankForm);
  });

  it('takes no direction from an address that has none of the two', () => {
    expect(fromQuery((name) => (name === 'turns' ? 'left' : null)).turns).toBe('');
  });
});
