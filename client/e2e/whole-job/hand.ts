import { randomUUID } from 'node:crypto';
import type { APIResponse, Page } from '@playwright/test';

/** A signed-in person's requests past their page, in the same session. */
export class Hand {
  constructor(private readonly page: Page) {}

  /** What the api answers at an address under /api. Throws when it refuses. */
  async get<T>(path: string): Promise<T> {
    return read<T>(await this.page.request.get(`/api${path}`));
  }

  /** Sends something to be kept, and answers what the api made of it. Throws when it refuses. */
  async post<T>(path: string, body: object): Promise<T> {
    return read<T>(await this.send(path, body));
  }

  /** Sends something to be kept as the page would, and leaves it to the caller what comes of it. */
  async send(path: string, body: object): Promise<APIResponse> {
    const cookies = await this.page.context().cookies();
    const token = cookies.find(({ name }) => name === 'XSRF-TOKEN')?.value ?? '';
    const headers = { 'X-XSRF-TOKEN': token, 'Idempotency-Key': randomUUID() };
    return this.page.request.post(`/api${path}`, { data: body, headers });
  }
}

async function read<T>(answer: APIResponse): Promise<T> {
  if (!answer.ok()) throw new Error(`${answer.url()}: ${answer.status()} ${await answer.text()}`);
  return (await answer.json()) as T;
}
