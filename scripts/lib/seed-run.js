// @ts-check
// The body of `npm run seed`.
import { ensureCompiled } from './build.js';
import { closeAll, closeOnSignal, runBody } from './closing.js';
import { dataFolder, ensureRoom, makeDataFolder } from './data-folder.js';
import { installPackages } from './install.js';
import { apiReload } from './places.js';
import { run } from './run.js';
import { Trouble, say } from './say.js';

/** The shops of the demo; any other shop is somebody's work. */
const demoShops = ['Low Mill Motor Works', 'Harbour Lane Engines'];

/** @param {string} url @returns {Promise<string[]>} the names of shops that are not the demo's */
const otherShops = async (url) => {
  const { withDatabase } = await import('./sql.js');
  return withDatabase(url, async (client) => {
    const table = await client.query("SELECT to_regclass('public.shop') AS shop");
    if (table.rows[0]?.shop === null) return [];
    const shops = await client.query('SELECT name FROM public.shop WHERE name <> ALL ($1) ORDER BY name', [
      demoShops,
    ]);
    return shops.rows.map(({ name }) => String(name));
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

  const others = process.argv.includes('--yes') ? [] : await otherShops(url);
  if (others.length > 0) {
    throw new Trouble(
      `The database in ${where} holds other shops than the demo's: ${others.join(', ')}. ` +
        'Everything in it would be lost. To empty it all the same: npm run seed -- --yes',
    );
  }
  say(`Emptying the database in ${where} and loading the demo …`);
  const env = { ...process.env, DATABASE_URL: url, DATA_DIR: `${folder}/files` };
  if ((await run(process.execPath, [apiReload], { env })) !== 0) {
    throw new Trouble('The demo could not be loaded; the reason is above.');
  }
  say('The demo is loaded.');
  await closeAll();
  process.exit(0);
});
