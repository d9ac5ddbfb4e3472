import type { Working } from '@second-spanner/shared/workings/working';
import { describe, expect, it } from 'vitest';
import { isSameCase, onlyOwn, strayErrors, visibleSections } from './case';

const working = {
  sections: [
    {
      heading: 'One',
      fields: [
        { kind: 'text', name: 'a', label: 'A' },
        { kind: 'text', name: 'b', label: 'B', when: ({ a }) => a === 'yes' },
        {
          kind: 'rows',
          name: 'list',
          label: 'List',
          row: 'row',
          least: 1,
          most: 2,
          columns: [{ kind: 'text', name: 'cell', label: 'Cell' }],
        },
      ],
    },
    { heading: 'Two', fields: [{ kind: 'text', name: 'c', label: 'C', when: () => false }] },
  ],
} satisfies Pick<Working, 'sections'> as unknown as Working;

describe('a case', () => {
  it('holds what the working has fields for, whatever the address says', () => {
    expect(onlyOwn(working, { a: '1', utm: 'x', toString: 'y' })).toEqual({ a: '1' });
  });

  it('holds what it was begun from', () => {
    expect(onlyOwn(working, { of: 'AT18, edition 2: head nuts' })).toEqual({
      of: 'AT18, edition 2: head nuts',
    });
  });

  it('shows a field only where the rest of the case asks for it, and no empty section', () => {
    const names = (a: string) =>
      visibleSections(working, { a }).map(({ fields }) => fields.map(({ name }) => name));
    expect(names('no')).toEqual([['a', 'list']]);
    expect(names('yes')).toEqual([['a', 'b', 'list']]);
  });

  it('is the same with a field empty or missing', () => {
    expect(isSameCase({ a: '1', b: '' }, { a: '1' })).toBe(true);
    expect(isSameCase({ a: '1' }, { a: '1', b: '2' })).toBe(false);
  });

  it('has its errors at their fields, and the others said elsewhere', () => {
    const errors = {
      a: 'at a',
      'list.1.cell': 'at the cell',
      list: 'at the list',
      b: 'hidden',
      whole: 'none',
    };
    expect(strayErrors(working, {}, { errors })).toEqual(['hidden', 'none']);
  });
});
