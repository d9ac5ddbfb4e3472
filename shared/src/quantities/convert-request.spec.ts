import { describe, expect, it } from 'vitest';
import type { ConvertRequest } from '../contracts/calculations.js';
import { convertRequest } from './convert-request.js';

const ask = (request: unknown) => convertRequest(request as ConvertRequest);

describe('convertRequest', () => {
  it('converts, with aliases on the way in and the canonical symbol on the way out', () => {
    // T1-009: 27 lbf·ft = 324 lbf·in, by definition.
    expect(ask({ quantity: { value: 27, unit: 'ft-lb' }, to: 'in-lb' })).toEqual({
      quantity: { value: 324, unit: 'lbf·in' },
    });
  });

  it('takes negative figures', () => {
    // T1-017: 1 in = 25.4 mm.
    expect(ask({ quantity: { value: -1, unit: 'in' }, to: 'mm' }).quantity.value).toBe(-25.4);
  });

  it.each<[unknown, string]>([
    [null, 'request'],
    [{}, 'quantity'],
    [{ quantity: { value: 27, unit: 'Nm' } }, 'to'],
    [{ quantity: { value: 27, unit: 'Nm' }, to: 'mm' }, 'to'],
    [{ quantity: { value: 27, unit: 'Nm' }, to: 5 }, 'to'],
    [{ quantity: { value: 27, unit: 'x' }, to: 'mm' }, 'quantity.unit'],
    [{ quantity: { value: null, unit: 'mm' }, to: 'mm' }, 'quantity.value'],
    [{ quantity: { value: -300, unit: '°C' }, to: 'K' }, 'quantity.value'],
  ])('refuses %j on %s', (request, field) => {
    expect(() => ask(request)).toThrow(expect.objectContaining({ name: 'InputError', field }));
  });
});
