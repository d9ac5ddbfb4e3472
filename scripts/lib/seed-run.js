// @ts-check
// The body of `npm run seed`.
import { ensureCompiled } from './build.js';
import { closeAll, closeOnSignal, runBody } from './closing.js';
import { dataFolder, ensureRoom, keptSecret, makeDataFolder } from './data-folder.js';
import { installPackages } from './install.js';
import { apiReload } from './places.js';
import { run } from './run.js';
import { Trouble, say } from './say.js';

/**
 * What of somebody's work the database holds, in words; nothing when it holds the demo alone or is empty.
 * @param {string} url @returns {Promise<string | undefined>}
 */
const workIn = async (url) => {
  const { withDatabase } = await import('./sql.js');
  return withDatabase(url, async (client) => {
    const tables = await client.query("SELECT tablename FROM pg_tables WHERE schemaname = 'public'");
    if (tables.rows.length === 0) return undefined;
    if (!tables.rows.some(({ tablename }) => tablename === 'shops')) return 'tables that are not ours';
    await client.query("SELECT set_config('second_spanner.setup', 'yes', false)");
    const shops = await client.query('SELECT name FROM shops WHERE NOT demo ORDER BY name');
    if (shops.rows.length === 0) return undefined;
    return `shops other than the demo's (${shops.rows.map(({ name }) => name).join(', ')})`;
  });
};

await runBody(async () => {
  closeOnSignal(130);
  const folder = dataFolder();
  ensureRoom(folder);
  makeDataFolder(folder);
  await installPackages();
  await ensureCompiled();
  const { openDatabase } = await import('./database.js');
  const { url, where } = await openDatabase(folder, { borrow: true });

  const work = process.argv.includes('--yes') ? undefined : await workIn(url);
  if (work) {
    throw new Trouble(
      `The database in ${where} holds ${work}. Everything in it would be lost. ` +
        'To empty it all the same: npm run seed -- --yes',
    );
  }
  say(`Emptying the database in ${where} and loading the demo …`);
  const secret = keptSecret(folder, 'token-secret');
  const env = { ...process.env, DATABASE_URL: url, DATA_DIR: `${folder}/files`, JWT_SECRET: secret };
  if ((await run(process.execPath, [apiReload], { env })) !== 0) {
    throw new Trouble('The demo could not be loaded; the reason is above.');
  }
  say('The demo is loaded.');
  await closeAll();
  process.exit(0);
});
