import { format, resolveConfig } from 'prettier';
import { expect, it } from 'vitest';
import { makeContractSchemas } from './testing/make-contract-schemas.js';

// Brought up to date by the same test: npx vitest run --root api --project unit src/platform/schemas -u
it('the schemas in the file are those of the contract types at hand', async () => {
  const file = new URL('../../../schemas/contracts.json', import.meta.url).pathname;
  const options = { ...(await resolveConfig(file)), parser: 'json' };
  await expect(await format(JSON.stringify(makeContractSchemas()), options)).toMatchFileSnapshot(file);
}, 60_000);
