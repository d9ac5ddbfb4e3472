// @ts-check
// The body of scripts/serve-for-tests.js.
import { randomBytes } from 'node:crypto';
import { mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { apiEnvironment, startApi } from './api.js';
import { closeOnSignal, onClose, runBody } from './closing.js';
import { startMailbox } from './mailbox.js';
import { ensureDatabase } from './sql.js';
import { startThrowAway } from './throw-away.js';

await runBody(async () => {
  closeOnSignal(0);
  const port = Number(process.env['E2E_PORT'] ?? '4399');
  const superUrl = process.env['TEST_DATABASE_URL'] ?? (await startThrowAway()).url;
  const folder = mkdtempSync(join(tmpdir(), 'second-spanner-pages-'));
  onClose(() => rmSync(folder, { recursive: true, force: true }));
  mkdirSync(join(folder, 'files'));
  mkdirSync(join(folder, 'mail'));

  const role = `pages_${process.pid}`;
  const password = randomBytes(18).toString('base64url');
  await ensureDatabase(superUrl, { name: role, role, password });
  const databaseUrl = Object.assign(new URL(superUrl), {
    username: role,
    password,
    pathname: `/${role}`,
  }).href;
  const { smtpUrl } = await startMailbox(join(folder, 'mail'));
  const secret = randomBytes(32).toString('base64url');
  await startApi(apiEnvironment({ port, databaseUrl, files: join(folder, 'files'), smtpUrl, secret }), {
    quiet: true,
  });
});
