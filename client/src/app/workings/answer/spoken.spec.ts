import type { WorkingAnswer } from '@second-spanner/shared/workings/working';
import { describe, expect, it } from 'vitest';
import { inShort } from './spoken';

const blank: WorkingAnswer = { errors: {}, missing: null, parts: [], assumed: [], cautions: [], basis: [] };
const facts = { kind: 'facts', facts: [{ name: 'Setting', value: '32.7 N·m' }] } as const;

describe('an answer in short', () => {
  it('is the judgement before any figure', () => {
    const judgement = { kind: 'judgement', verdict: 'fail', reason: 'It is 2 mm too long.' } as const;
    expect(inShort({ ...blank, parts: [facts, judgement] })).toBe('Fail: It is 2 mm too long.');
  });

  it('says the judgement’s own word, and waiting for what only waits', () => {
    const judgement = { kind: 'judgement', verdict: 'fail', reason: 'Two days still.', waits: true } as const;
    expect(inShort({ ...blank, parts: [judgement] })).toBe('Waiting: Two days still.');
    const named = { ...judgement, word: 'Wait' };
    expect(inShort({ ...blank, parts: [named] })).toBe('Wait: Two days still.');
  });

  it('is the first figure where nothing is judged', () => {
    expect(inShort({ ...blank, parts: [facts] })).toBe('Setting: 32.7 N·m');
  });

  it('is what is missing or wrong where there is no answer', () => {
    expect(inShort({ ...blank, missing: 'Still to be filled in: length.' })).toMatch(/length/);
    expect(inShort({ ...blank, errors: { length: 'No.' } })).toMatch(/put right/);
  });
});
