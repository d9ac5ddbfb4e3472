import { describe, expect, it } from 'vitest';
import { partFigures } from './figures';

describe('the figures of a sentence', () => {
  it('are parted from the words, each with its unit', () => {
    expect(partFigures('The limit is 1.0 mm and 0.5°.')).toEqual([
      { words: 'The limit is ' },
      { figure: '1.0', unit: 'mm' },
      { words: ' and ' },
      { figure: '0.5°', unit: undefined },
      { words: '.' },
    ]);
  });

  it.each(['55\u2009N·m', '40 lbf·ft', '0,18\u00A0mm', '16 °C'])('keep the unit of %s', (text) => {
    const pieces = partFigures(`It read ${text}, twice.`);
    expect(pieces).toHaveLength(3);
    expect(pieces[1]?.unit).toBe(text.split(/\s/)[1]);
  });

  it.each(['T-07', 'LM-0147', '1-3-4-2', '8.6', '13:51', '±1.1', '−0.02'])('take %s as one', (figure) => {
    expect(partFigures(`Read ${figure} again.`)).toEqual([
      { words: 'Read ' },
      { figure, unit: undefined },
      { words: ' again.' },
    ]);
  });

  it('leave words alone that only hold a digit, and units that begin a word', () => {
    expect(partFigures('Workshop manual 3rd ed.')).toEqual([{ words: 'Workshop manual 3rd ed.' }]);
    expect(partFigures('4 minutes')).toEqual([{ figure: '4', unit: undefined }, { words: ' minutes' }]);
  });

  it('lose nothing of the sentence', () => {
    const sentence = 'Nut 6 of M10x1.25 at 54.6 N·m, 0.4 N·m inside; En 0.64 (T-04).';
    const joined = partFigures(sentence)
      .map(({ words, figure, unit }) => words ?? (unit === undefined ? figure : `${figure ?? ''} ${unit}`))
      .join('');
    expect(joined).toBe(sentence);
  });
});
