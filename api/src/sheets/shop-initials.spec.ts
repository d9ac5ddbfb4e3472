import { describe, expect, it } from 'vitest';
import { pdfName } from '../build-sheets/build-sheets.service.js';
import { shopInitials } from './shop-initials.js';

describe('the initials of a shop', () => {
  it.each([
    ['Low Mill Motor Works', 'LM'],
    ['forge', 'F'],
    ['Ölmühle Übersee', 'OU'],
    ['"Old" (Mill)', 'OM'],
    ['Łódka & Syn', 'OS'],
    ['Мастерская', 'S'],
    ['  ', 'S'],
  ])('of %j are %s', (name, initials) => {
    expect(shopInitials(name)).toBe(initials);
  });
});

describe('the name of a printed sheet', () => {
  it('can stand in a header, whatever the code holds', () => {
    expect(pdfName('LM-0001')).toBe('build-sheet-LM-0001.pdf');
    expect(pdfName('Я"\r\n-0001')).toBe('build-sheet-____-0001.pdf');
  });
});
