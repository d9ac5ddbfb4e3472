import express from 'express';
import supertest from 'supertest';
import { expect, it } from 'vitest';
import { healthRoutes } from './health.routes.js';

it('health looks at the database once a second at most, however many ask', async () => {
  let [at, pings] = [5, 0];
  const ping = (): Promise<void> => {
    pings += 1;
    return Promise.resolve();
  };
  const app = express().use(healthRoutes({ ping }, () => at));
  for (let i = 0; i < 5; i++) await supertest(app).get('/').expect(200);
  expect(pings).toBe(1);
  at += 1_000;
  await supertest(app).get('/').expect(200);
  expect(pings).toBe(2);
});
