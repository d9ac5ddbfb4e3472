import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import type { SpecDocument } from '../../contracts/spec.js';
import { workingText } from '../working-text.js';
import { wiringMapWorking } from './wiring-map.js';

const british = { dialect: 'british' } as const;
const { typed } = wiringMapWorking.example;
const at = (change: Record<string, string>) => wiringMapWorking.workOut({ ...typed, ...change }, british);

describe('the wiring map as a working', () => {
  // Common practice, no source: with an anticlockwise rotor 1-3-4-2 goes round the cap against the clock from No. 1,
  // here 315°, 225°, 135°, 45°, which is how the example has it fitted.
  it('finds the example wired right', () => {
    const answer = at({});
    expect(answer.errors).toEqual({});
    expect(answer.parts).toContainEqual(expect.objectContaining({ kind: 'judgement', verdict: 'pass' }));
    expect(answer.parts.filter(({ kind }) => kind === 'drawing')).toHaveLength(2);
  });

  it('says which leads to swap, and that the set was wired against the rotor', () => {
    const answer = at({ fitted: '315:1,225:2,135:4,45:3' });
    expect(answer.parts).toContainEqual(
      expect.objectContaining({ kind: 'judgement', of: 'Wired against the rotor', verdict: 'fail' }),
    );
    expect(answer.parts).toContainEqual(
      expect.objectContaining({ kind: 'steps', steps: [expect.stringContaining('{Lead}')] }),
    );
  });

  it('names a wrong figure by the name that the address has for it', () => {
    expect(at({ at: 'top' }).errors).toHaveProperty('at');
    expect(at({ valves: '10_x_50_10' }).errors).toHaveProperty('valves');
  });

  it.each(['at18', 'bx26', 'cv34'])('begins from the spec %s', (name) => {
    const path = new URL(`../../../../test-data/specs/ok/${name}.json`, import.meta.url);
    const document = JSON.parse(readFileSync(path, 'utf8')) as SpecDocument;
    const [first] = wiringMapWorking.fromSpec?.(document) ?? [];
    const answer = wiringMapWorking.workOut(first?.typed ?? {}, british);
    expect(answer).toMatchObject({ errors: {}, missing: null });
    expect(answer.parts).toContainEqual(expect.objectContaining({ kind: 'table' }));
  });

  it('reads as plain text in either trade’s words', () => {
    const text = workingText(wiringMapWorking, typed, at({}), {
      dialect: 'american',
      address: 'https://shop.example/workings/wiring',
    });
    expect(text).toContain('Firing order: 1-3-4-2');
    expect(text).toContain('Pass');
    expect(text).toContain('https://shop.example/workings/wiring');
    expect(text).not.toMatch(/[{}]/);
  });

  it('says what was typed in words', () => {
    const traced = {
      ...typed,
      from: 'cap',
      posts: '45, 135, 225, 315',
      trace: '45:C,135:D,225:A,315:B',
      valves: '16_56_51_21',
      fitted: 'A:1,45:2',
      beside: '45:D,135:C',
      of: 'AT18, edition 2',
    };
    const text = workingText(wiringMapWorking, traced, at({}), british);
    expect(text).toContain('Begun from: AT18, edition 2');
    expect(text).toContain('45° to C, 135° to D, 225° to A, 315° to B');
    expect(text).toContain(
      'inlet opens 16° before TDC, inlet closes 56° after BDC, exhaust opens 51° before BDC',
    );
    expect(text).toContain('A to No. 1, 45° to No. 2');
    expect(text).toContain('D at 45°, C at 135°');
  });
});
