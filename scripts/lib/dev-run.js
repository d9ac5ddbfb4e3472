// @ts-check
// The body of `npm run dev`: compilers that watch, and an api that starts again when its code changes.
import { apiEnvironment, startApi } from './api.js';
import { ensureCompiled } from './build.js';
import { closeAll, closeOnSignal, isClosing, runBody } from './closing.js';
import { root } from './places.js';
import { enter, noteApi, surroundings, tellPlaces } from './premises.js';
import { begin } from './run.js';
import { say } from './say.js';

/** @param {string} name @param {string} script @param {string[]} args */
const watch = (name, script, args) => {
  const env = { ...process.env, NG_CLI_ANALYTICS: 'false' };
  const child = begin(process.execPath, [`${root}/node_modules/${script}`, ...args], {
    env,
    stdio: ['ignore', 'inherit', 'inherit'],
  });
  child.once('exit', () => {
    if (isClosing()) return;
    process.stderr.write(`\n${name} has ended by itself.\n`);
    void closeAll().then(() => process.exit(1));
  });
};

await runBody(async () => {
  closeOnSignal(0);
  const { folder, port } = await enter();
  await ensureCompiled();
  const { database, mailbox, files, secret } = await surroundings(folder);
  watch('The compiler of shared and api', 'typescript/bin/tsc', [
    '-b',
    'shared',
    'api',
    '--watch',
    '--preserveWatchOutput',
  ]);
  watch('The build of the pages', '@angular/cli/bin/ng.js', [
    'build',
    '--watch',
    '--configuration',
    'development',
  ]);
  const env = apiEnvironment({ port, databaseUrl: database.url, files, smtpUrl: mailbox.smtpUrl, secret });
  const { address } = await startApi(env, {
    nodeArgs: ['--watch', '--watch-preserve-output'],
    onSpawn: (pid) => noteApi(folder, `http://127.0.0.1:${port}`, pid),
  });
  tellPlaces({ address, folder, database: database.where, mail: mailbox.address });
  say('The pages are there as soon as their first build is done; reload to see a change.');
});
