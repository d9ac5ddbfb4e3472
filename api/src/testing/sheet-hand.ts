import { randomUUID } from 'node:crypto';
import type supertest from 'supertest';
import type { EntryContent, SecondReadingContent } from '@second-spanner/shared/contracts/steps';
import type { SettleSnagRequest, SignatureMeaning } from '@second-spanner/shared/contracts/sheets';
import type { TestClient } from './test-client.js';
import { demoPassword } from './workshop.js';

interface Correction {
  readonly replaces: string;
  readonly reason: string;
}

/** One person's hand on one sheet, through the routes. */
export class SheetHand {
  constructor(
    readonly client: TestClient,
    readonly id: string,
  ) {}

  sheet(): supertest.Test {
    return this.client.get(`/sheets/${this.id}`);
  }

  step(code: string): supertest.Test {
    return this.client.get(`/sheets/${this.id}/steps/${code}`);
  }

  record(code: string, content: EntryContent, correction?: Correction, key = randomUUID()): supertest.Test {
    return this.post(`steps/${code}/entries`, { content, ...correction }).set('Idempotency-Key', key);
  }

  readAgain(code: string, content: SecondReadingContent, key = randomUUID()): supertest.Test {
    return this.post(`steps/${code}/second-readings`, { content }).set('Idempotency-Key', key);
  }

  countersign(code: string, pullsWitnessed?: string[], key = randomUUID()): supertest.Test {
    const body = { outcome: 'agree', ...(pullsWitnessed && { pullsWitnessed }) };
    return this.post(`steps/${code}/countersignatures`, body).set('Idempotency-Key', key);
  }

  dispute(code: string, reason: string): supertest.Test {
    const body = { outcome: 'dispute', reason };
    return this.post(`steps/${code}/countersignatures`, body).set('Idempotency-Key', randomUUID());
  }

  settle(snagId: string, request: SettleSnagRequest): supertest.Test {
    return this.post(`snags/${snagId}/settlements`, request);
  }

  sign(meaning: SignatureMeaning, password = demoPassword): supertest.Test {
    return this.post('signatures', { meaning, password });
  }

  post(path: string, body: object): supertest.Test {
    return this.client.post(`/sheets/${this.id}/${path}`, body);
  }
}
