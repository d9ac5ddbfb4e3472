// @ts-check
// What has to be fetched: first, for each page that is loaded when it is opened, and to work without a network: what
// the service worker fetches with the first visit, and what it keeps only once it was opened.
// Text counts as brotli makes it, files that are packed already as they are.
import { existsSync, readFileSync, readdirSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { brotliCompressSync } from 'node:zlib';
import { clientBuilt } from '../lib/places.js';
import { kB } from './figures.js';

/** @typedef {import('./table.js').Row} Row */

/** @param {string} name */
const read = (name) => readFileSync(join(clientBuilt, name));

/** @type {Map<string, number>} */
const known = new Map();

/** @param {string} name */
const sizeOf = (name) => {
  const size = known.get(name) ?? Math.min(brotliCompressSync(read(name)).length, read(name).length);
  known.set(name, size);
  return size;
};

/** @param {Iterable<string>} names */
const sizeOfAll = (names) => [...names].reduce((sum, name) => sum + sizeOf(name), 0);

/** @param {string} text @param {RegExp} pattern */
const all = (text, pattern) => [...text.matchAll(pattern)].map(([, name = '']) => name.replace(/^\.?\//, ''));

/** @param {string} script */
const importsOf = (script) => {
  const text = read(script).toString('utf8');
  return {
    now: all(text, /(?:\bfrom|\bimport)\s*"(\.\/[\w-]+\.js)"/g),
    later: all(text, /\bimport\("(\.\/[\w-]+\.js)"\)/g),
  };
};

/** Scripts with everything that they import at once. @param {string[]} scripts @param {Set<string>} [without] @returns {Set<string>} */
const closureOf = (scripts, without = new Set()) => {
  /** @type {Set<string>} */
  const found = new Set();
  const add = (/** @type {string} */ script) => {
    if (found.has(script) || without.has(script)) return;
    found.add(script);
    importsOf(script).now.forEach(add);
  };
  scripts.forEach(add);
  return found;
};

/** Every script that something imports only when it is needed, with what it then brings along. @param {Set<string>} first */
const lazyOf = (first) => {
  /** @type {Map<string, Set<string>>} */
  const found = new Map();
  const follow = (/** @type {Iterable<string>} */ scripts) => {
    for (const script of scripts) {
      for (const later of importsOf(script).later) {
        if (found.has(later) || first.has(later)) continue;
        const whole = closureOf([later], first);
        found.set(later, whole);
        follow(whole);
      }
    }
  };
  follow(first);
  return found;
};

/** The element that stands for a script: its last one, which is built from those before. @param {string} script */
const elementOf = (script) =>
  all(read(script).toString('utf8'), /selectors:\[\["(ss-[\w-]+)"/g).at(-1) ?? script;

/** What the service worker keeps, fonts apart: from the first visit on, and each file once it was opened. */
const keptOffline = () => {
  if (!existsSync(join(clientBuilt, 'ngsw.json'))) return undefined;
  /** @type {{ assetGroups: { installMode: string, urls: string[] }[] }} */
  const { assetGroups } = JSON.parse(read('ngsw.json').toString('utf8'));
  const urlsOf = (/** @type {string} */ mode) =>
    assetGroups
      .filter(({ installMode }) => installMode === mode)
      .flatMap(({ urls }) => urls.map((url) => url.slice(1)))
      .filter((url) => !/\.woff2?$/.test(url));
  return {
    fromFirstVisit: new Set([...urlsOf('prefetch'), 'ngsw.json', 'ngsw-worker.js']),
    onceOpened: new Set(urlsOf('lazy')),
  };
};

/** @param {string} what @param {number} size @param {number} most kB @returns {Row} */
const sizeRow = (what, size, most) => ({
  what,
  goal: `≤ ${most} kB`,
  measured: kB(size),
  met: size <= most * 1000,
});

/** @returns {Promise<Row[]>} */
export const measureSizes = async () => {
  const page = read('index.html').toString('utf8');
  const styles = all(page, /<link[^>]*rel="stylesheet"[^>]*href="([^"]+)"/g);
  const scripts = closureOf([
    ...all(page, /<script[^>]*src="([^"]+)"/g),
    ...all(page, /<link[^>]*rel="modulepreload"[^>]*href="([^"]+)"/g),
  ]);
  const lazy = [...lazyOf(scripts)]
    .map(([script, whole]) => ({ script, size: sizeOfAll(whole) }))
    .sort((a, b) => b.size - a.size);
  const largest = lazy[0];
  const offline = keptOffline();
  const fonts = readdirSync(join(clientBuilt, 'fonts')).map(
    (name) => statSync(join(clientBuilt, 'fonts', name)).size,
  );
  return [
    sizeRow('first download, brotli', sizeOfAll(['index.html', ...styles, ...scripts]), 110),
    ...(largest
      ? [sizeRow(`largest of ${lazy.length} lazy pages (${elementOf(largest.script)})`, largest.size, 70)]
      : []),
    ...lazy.slice(1, 6).map(({ script, size }) => ({
      ...sizeRow(`  next largest (${elementOf(script)})`, size, 70),
    })),
    ...(offline
      ? [
          sizeRow(
            'kept for offline from the first visit on, fonts apart',
            sizeOfAll(offline.fromFirstVisit),
            350,
          ),
          {
            what: 'kept for offline only once opened: workings, the start of a sheet',
            goal: '',
            measured: kB(sizeOfAll(offline.onceOpened)),
          },
        ]
      : []),
    { what: 'fonts', goal: '', measured: kB(fonts.reduce((sum, size) => sum + size, 0)) },
  ];
};
