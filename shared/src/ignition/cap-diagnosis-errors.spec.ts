import { describe, expect, it } from 'vitest';
import type { CapDiagnosisRequest } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import { capDiagnosis } from './cap-diagnosis.js';

const cap = { firingOrder: [1, 3, 4, 2], rotation: 'clockwise' };
const traced = { ...cap, trace: { 1: 'A', 2: 'B', 3: 'C', 4: 'D' } };
const fitted = { 1: 1, 2: 3, 3: 4, 4: 2 };
const valveTiming = { ivo: 7, ivc: 39, evo: 51, evc: 3 };
const aMegabyte = 'x'.repeat(1_000_000);

/** What is thrown for a request as it might come in: not bound to the type. */
function refusalOf(request: unknown): InputError {
  try {
    capDiagnosis(request as CapDiagnosisRequest);
  } catch (error) {
    if (error instanceof InputError) return error;
    throw error;
  }
  throw new Error('It was taken.');
}

describe('capDiagnosis refuses', () => {
  it.each<[string, unknown, string]>([
    ['nothing', null, 'request'],
    ['no cap', { fitted }, 'cap'],
    ['a cap without a rotation', { cap: { firingOrder: [1] }, fitted: { 1: 1 } }, 'cap.rotation'],
    ['a wrong item of the cap', { cap: { ...cap, firingOrder: [1, 3, 3, 2] }, fitted }, 'cap.firingOrder[2]'],
    ['a two-stroke', { cap: { ...cap, strokesPerCycle: 2 }, fitted }, 'cap.strokesPerCycle'],
    ['nothing fitted', { cap }, 'fitted'],
    ['a list of what is fitted', { cap, fitted: [1, 3, 4, 2] }, 'fitted'],
    ['a post left out', { cap, fitted: { 1: 1, 2: 3, 3: 4 } }, 'fitted'],
    ['a post too many', { cap, fitted: { ...fitted, 5: 1 } }, 'fitted'],
    ['a cylinder twice', { cap, fitted: { ...fitted, 4: 1 } }, 'fitted.4'],
    ['a cylinder that is not there', { cap, fitted: { ...fitted, 4: 5 } }, 'fitted.4'],
    ['a number as text', { cap, fitted: { ...fitted, 4: '2' } }, 'fitted.4'],
    ['a post without a cylinder', { cap, fitted: { ...fitted, 4: null } }, 'fitted.4'],
    ['a text of a megabyte for a cylinder', { cap, fitted: { ...fitted, 4: aMegabyte } }, 'fitted.4'],
    ['a post of a megabyte', { cap, fitted: { ...fitted, [aMegabyte]: 1 } }, 'fitted'],
    ['a prototype for a post', { cap, fitted: JSON.parse('{"__proto__":1}') as unknown }, 'fitted'],
    [
      'a thousand posts',
      { cap, fitted: Object.fromEntries(Array.from({ length: 1000 }, (_, i) => [i, i])) },
      'fitted',
    ],
    ['outlets where posts are meant', { cap: traced, fitted: { A: 1, B: 3, C: 4, D: 2 } }, 'fitted'],
    ['posts where outlets are meant', { cap: traced, fitted, fittedBy: 'outlet' }, 'fitted'],
    ['fitted by something else', { cap, fitted, fittedBy: 'lead' }, 'fittedBy'],
    ['half a valve timing', { cap, fitted, valveTiming: { ivo: 7, ivc: 39 } }, 'valveTiming.evo'],
    [
      'NaN in the valve timing',
      { cap, fitted, valveTiming: { ...valveTiming, evc: Number.NaN } },
      'valveTiming.evc',
    ],
    ['an absurd valve timing', { cap, fitted, valveTiming: { ...valveTiming, ivo: 1e9 } }, 'valveTiming.ivo'],
    ['NaN of advance', { cap, fitted, advance: Number.NaN }, 'advance'],
    ['half a turn of advance', { cap, fitted, advance: 180 }, 'advance'],
    ['a text for the advance', { cap, fitted, advance: '10' }, 'advance'],
  ])('%s', (_, request, field) => {
    const refusal = refusalOf(request);
    expect(refusal.field).toBe(field);
    expect(refusal.message.length).toBeGreaterThan(10);
    expect(refusal.message.length).toBeLessThan(400);
  });

  it('says where a cylinder is fitted twice, what is missing and what there is', () => {
    expect(refusalOf({ cap, fitted: { ...fitted, 4: 1 } }).message).toMatch(/1 is on post 1 and post 4/);
    expect(refusalOf({ cap, fitted: { 1: 1, 2: 3 } }).message).toContain('3 and 4 is missing');
    expect(refusalOf({ cap, fitted: { ...fitted, 9: 1 } }).message).toMatch(/no post “9”.*1, 2, 3 and 4/);
  });
});
