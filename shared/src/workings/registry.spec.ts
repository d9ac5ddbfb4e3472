import { describe, expect, it } from 'vitest';
import { workingNamed, workings } from './registry.js';
import { workingGroups } from './working.js';

describe('the list of workings', () => {
  it('names each once, group by group', () => {
    const keys = workings.map(({ key }) => key);
    expect(new Set(keys).size).toBe(keys.length);
    const order = workings.map(({ group }) => workingGroups.indexOf(group));
    expect(order).toEqual(order.toSorted((a, b) => a - b));
  });

  it('finds a working by its key, and nothing for another', () => {
    expect(workingNamed('convert')?.group).toBe('convert');
    expect(workingNamed('toString')).toBeUndefined();
  });

  it.each(workings)('says of $key what the working itself says', async (entry) => {
    const { key, group, title, asks } = await entry.load();
    expect({ key, group, title, asks }).toEqual({
      key: entry.key,
      group: entry.group,
      title: entry.title,
      asks: entry.asks,
    });
  });

  it.each(workings)('answers the example of $key, in both dialects', async ({ load }) => {
    const working = await load();
    for (const dialect of ['british', 'american'] as const) {
      const answer = working.workOut(working.example.typed, { dialect });
      expect(answer.errors).toEqual({});
      expect(answer.missing).toBeNull();
      expect(answer.parts.length).toBeGreaterThan(0);
    }
  });

  it.each(workings)('takes $key with nothing typed', async ({ load }) => {
    const answer = (await load()).workOut({}, { dialect: 'british' });
    expect(Object.keys(answer.errors)).toEqual([]);
  });
});
