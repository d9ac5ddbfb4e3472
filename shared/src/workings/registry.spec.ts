import { describe, expect, it } from 'vitest';
import { workingNamed, workings } from './registry.js';
import { begunFrom, workingGroups } from './working.js';

/** Loaded before anything is timed: one of them brings a parser of hundreds of modules. */
const loaded = await Promise.all(
  workings.map(async (entry) => ({ key: entry.key, entry, working: await entry.load() })),
);

describe('the list of workings', () => {
  it('names each once, group by group', () => {
    const keys = workings.map(({ key }) => key);
    expect(new Set(keys).size).toBe(keys.length);
    const order = workings.map(({ group }) => workingGroups.indexOf(group));
    expect(order).toEqual([...order].sort((a, b) => a - b));
  });

  it('leaves the name of what a case was begun from to no field', () => {
    const names = loaded.flatMap(({ working }) => working.sections.flatMap(({ fields }) => fields));
    expect(names.filter(({ name }) => name === begunFrom)).toEqual([]);
  });

  it('finds a working by its key, and nothing for another', () => {
    expect(workingNamed('convert')?.group).toBe('convert');
    expect(workingNamed('toString')).toBeUndefined();
  });

  it.each(loaded)('says of $key what the working itself says', ({ entry, working }) => {
    const { key, group, title, asks } = working;
    expect({ key, group, title, asks }).toEqual({
      key: entry.key,
      group: entry.group,
      title: entry.title,
      asks: entry.asks,
    });
  });

  it.each(loaded)('answers the example of $key, in both dialects', ({ working }) => {
    for (const dialect of ['british', 'american'] as const) {
      const answer = working.workOut(working.example.typed, { dialect });
      expect(answer.errors).toEqual({});
      expect(answer.missing).toBeNull();
      expect(answer.parts.length).toBeGreaterThan(0);
    }
  });

  it.each(loaded)('takes $key with nothing typed', ({ working }) => {
    const answer = working.workOut({}, { dialect: 'british' });
    expect(Object.keys(answer.errors)).toEqual([]);
  });
});
