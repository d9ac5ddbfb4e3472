import { describe, expect, it } from 'vitest';
import { ConfigError, readConfig } from './config.js';

const least = { DATABASE_URL: 'postgres://u:p@127.0.0.1/d', JWT_SECRET: 'x'.repeat(32) };

describe('configuration', () => {
  it('needs a database and a secret, and has the rest by itself', () => {
    expect(readConfig(least)).toMatchObject({
      host: '127.0.0.1',
      port: 4300,
      clientDir: null,
      smtpUrl: null,
      demo: false,
      passwordCost: 12,
    });
  });

  it('names everything that is wrong at once', () => {
    const wrong = { ...least, PORT: '70000', PUBLIC_URL: 'workshop', JWT_SECRET: 'short', DATABASE_URL: '' };
    expect(() => readConfig(wrong)).toThrow(ConfigError);
    expect(() => readConfig(wrong)).toThrow(/PORT.*\nDATABASE_URL.*\nPUBLIC_URL.*\nJWT_SECRET/);
  });

  it.each(['', ' ', undefined])('refuses the secret %j', (JWT_SECRET) => {
    expect(() => readConfig({ ...least, JWT_SECRET })).toThrow('JWT_SECRET is not set');
  });
});
