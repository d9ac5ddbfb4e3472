// @ts-check
// The body of `npm start`.
import { apiEnvironment, startApi } from './api.js';
import { ensureBuilt } from './build.js';
import { closeAll, closeOnSignal, isClosing, runBody } from './closing.js';
import { enter, noteApi, surroundings, tellPlaces } from './premises.js';

await runBody(async () => {
  closeOnSignal(0);
  const { folder, port } = await enter();
  await ensureBuilt();
  const { database, mailbox, files, secret } = await surroundings(folder);
  const env = apiEnvironment({ port, databaseUrl: database.url, files, smtpUrl: mailbox.smtpUrl, secret });
  const { child, address } = await startApi(env, {
    onSpawn: (pid) => noteApi(folder, `http://127.0.0.1:${port}`, pid),
  });
  tellPlaces({ address, folder, database: database.where, mail: mailbox.address });
  child.once('exit', (code, signal) => {
    if (isClosing()) return;
    process.stderr.write(`\nThe api has ended by itself (${signal ?? `exit code ${code}`}).\n`);
    void closeAll().then(() => process.exit(1));
  });
});
