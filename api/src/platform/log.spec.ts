import { describe, expect, it } from 'vitest';
import { createLog } from './log.js';

/** As the driver and its wrapper fail: with the statement, its parameters and the refused row. */
class QueryFailedError extends Error {
  readonly query = 'INSERT INTO entries VALUES ($1)';
  readonly parameters = ['a reading'];
  readonly code = '23505';
  readonly detail = 'Key (mark)=(a row) already exists.';
  readonly driverError = { detail: this.detail };
}

describe('the log', () => {
  it('tells which error a failed statement is, without its SQL, parameters and row', () => {
    let line = '';
    const write = (text: string): void => {
      line += text;
    };
    createLog('error', { write }).error({ err: new QueryFailedError('duplicate key') }, 'A request failed.');
    const { err } = JSON.parse(line) as { err: Record<string, unknown> };
    expect(Object.keys(err).sort()).toEqual(['code', 'message', 'stack', 'type']);
    expect([err['type'], err['code']]).toEqual(['QueryFailedError', '23505']);
    expect(line).not.toMatch(/INSERT|a reading|a row/);
  });
});
