import 'reflect-metadata';
import { Type } from 'class-transformer';
import { IsArray, IsIn, IsNumber, IsString, ValidateNested } from 'class-validator';
import { describe, expect, it } from 'vitest';
import { HttpProblem } from '../errors/http-problem.js';
import { byTime, pageOf, parsePaging } from './paging.js';
import { parseBody } from './parse-body.js';

class PostDto {
  @IsString()
  post!: string;

  @IsNumber()
  angle!: number;
}

class CapDto {
  @IsIn(['clockwise', 'anticlockwise'])
  rotation!: string;

  @IsArray()
  @ValidateNested({ each: true })
  @Type(() => PostDto)
  posts!: PostDto[];
}

const errorsOf = (work: () => unknown): unknown => {
  try {
    return work();
  } catch (error) {
    return error instanceof HttpProblem ? error.errors : error;
  }
};

describe('a body', () => {
  it('that is right comes out as the DTO', () => {
    const cap = parseBody(CapDto, { rotation: 'clockwise', posts: [{ post: 'a', angle: 0 }] });
    expect(cap).toBeInstanceOf(CapDto);
    expect(cap.posts[0]).toBeInstanceOf(PostDto);
  });

  it('that is wrong is told by path and sentence, at any depth', () => {
    const body = {
      rotation: 'left',
      posts: [
        { post: 'a', angle: 0 },
        { post: 1, angle: 'x', colour: 'red' },
      ],
    };
    expect(errorsOf(() => parseBody(CapDto, body))).toEqual([
      { field: 'rotation', message: expect.stringMatching(/^This must be one of .*\.$/) },
      { field: 'posts[1].colour', message: 'This field is not known here.' },
      { field: 'posts[1].post', message: 'This must be a string.' },
      { field: 'posts[1].angle', message: expect.stringMatching(/^This must be a number .*\.$/) },
    ]);
  });

  it.each([undefined, null, 'text', 1, []])('%j is refused as a whole', (body) => {
    expect(errorsOf(() => parseBody(CapDto, body))).toEqual([
      { field: '', message: 'The request must be a JSON object.' },
    ]);
  });

  it.each(['__proto__', 'constructor', 'prototype'])('does not reach %s', (name) => {
    const body: unknown = JSON.parse(`{"rotation":"clockwise","posts":[],"${name}":{"polluted":true}}`);
    errorsOf(() => parseBody(CapDto, body));
    expect(({} as Record<string, unknown>)['polluted']).toBeUndefined();
  });
});

describe('a page', () => {
  it('leads to the next by the key of its last row', () => {
    const paging = parsePaging({ limit: '2' });
    const page = pageOf(
      ['a', 'b', 'c'],
      paging,
      (row) => [row],
      (row) => row.toUpperCase(),
    );
    expect(page.items).toEqual(['A', 'B']);
    expect(parsePaging({ cursor: page.next }).after).toEqual(['b']);
  });

  it('is the last when there is no row more', () => {
    const page = pageOf(
      ['a', 'b'],
      parsePaging({ limit: '2' }),
      (row) => [row],
      (row) => row,
    );
    expect(page.next).toBeNull();
  });

  const cursor = (...key: unknown[]): string => Buffer.from(JSON.stringify(key)).toString('base64url');
  const id = '00000000-0000-4000-8000-000000000000';

  it.each([
    [cursor('2026-12-01T14:06:00.000Z'), 'a column is missing'],
    [cursor('yesterday', id), 'the first is no time'],
    [cursor('2026-13-41T14:06:00.000Z', id), 'the first is no day there is'],
    [cursor('2026-12-01T14:06:00.000Z', 'me'), 'the second is no id'],
    [cursor('2026-12-01T14:06:00.000Z', 1), 'the second is no text'],
  ])('does not begin at %s: %s', (text) => {
    expect(errorsOf(() => parsePaging({ cursor: text }, byTime))).toEqual([
      { field: 'cursor', message: 'This cursor is none that was given out here.' },
    ]);
  });

  it('in order of time begins at a time and an id', () => {
    const after = ['2026-12-01T14:06:00.000Z', id];
    expect(parsePaging({ cursor: cursor(...after) }, byTime).after).toEqual(after);
  });
});
