// @ts-check
// What PostgreSQL was told for one request, by its own log.
import { readFileSync, statSync } from 'node:fs';
import { setTimeout as pause } from 'node:timers/promises';
import { withDatabase } from '../lib/sql.js';

/** @typedef {import('./stage.js').Stage} Stage */
/**
 * @typedef {object} Plan
 * @property {string} text the query
 * @property {string} outline how it was worked
 * @property {{ table: string, way: string }[]} ways how each table was reached
 */

/** @param {Stage} stage @param {string[]} commands */
const configure = async ({ database }, commands) => {
  await withDatabase(database, async (client) => {
    for (const command of commands) await client.query(command);
    await client.query('SELECT pg_reload_conf()');
  });
  // Every connection takes the change up when it is idle.
  await pause(500);
};

/** @param {Stage} stage */
const settings = ({ explains }) => [
  ['log_statement', "'all'"],
  ...(explains
    ? [
        ['auto_explain.log_min_duration', '0'],
        ['auto_explain.log_format', "'json'"],
      ]
    : []),
];

/** The log's lines for one request, made a second time so that every connection is set as usual. @param {Stage} stage @param {() => Promise<unknown>} request */
const logOf = async (stage, request) => {
  await configure(
    stage,
    settings(stage).map(([name, value]) => `ALTER SYSTEM SET ${name} = ${value}`),
  );
  try {
    await request();
    const { size } = statSync(stage.log);
    await request();
    await pause(300);
    return readFileSync(stage.log).subarray(size).toString('utf8');
  } finally {
    await configure(
      stage,
      settings(stage).map(([name]) => `ALTER SYSTEM RESET ${name}`),
    );
  }
};

/** How many statements PostgreSQL was sent for one request, all counted. @param {Stage} stage @param {() => Promise<unknown>} request */
export const statementsOf = async (stage, request) =>
  [...(await logOf(stage, request)).matchAll(/LOG: {2}(?:statement|execute [^:]*): /g)].length;

/** @typedef {Record<string, unknown> & { Plans?: Node[] }} Node */

/** A plan without its figures: which nodes, on which tables, by which indexes. @param {Node} node @returns {string} */
const outlineOf = (node) => {
  const at = node['Index Name'] ?? node['Alias'];
  const kind = [node['Join Type'], node['Node Type']].filter(Boolean).join(' ');
  const below = (node.Plans ?? []).map(outlineOf);
  return `${kind}${at ? ` ${at}` : ''}${below.length > 0 ? ` (${below.join(', ')})` : ''}`;
};

/** @param {Node} node @returns {string[]} */
const indexesOf = (node) => [
  ...(node['Index Name'] ? [String(node['Index Name'])] : []),
  ...(String(node['Node Type']).startsWith('Bitmap') ? (node.Plans ?? []).flatMap(indexesOf) : []),
];

/** @param {Node} node @returns {Plan['ways']} */
const waysOf = (node) => {
  const table = node['Relation Name'];
  const here = table
    ? [{ table: String(table), way: `${node['Node Type']} ${indexesOf(node).sort().join(' ')}`.trim() }]
    : [];
  return [...here, ...(node.Plans ?? []).flatMap(waysOf)];
};

/** The plans that PostgreSQL worked by for one request, in their order. @param {Stage} stage @param {() => Promise<unknown>} request @returns {Promise<Plan[]>} */
export const plansOf = async (stage, request) =>
  [...(await logOf(stage, request)).matchAll(/ plan:\n((?:\t.*\n)+)/g)].map(([, block = '']) => {
    const told = JSON.parse(block);
    return {
      text: told['Query Text'].replace(/\s+/g, ' ').trim(),
      outline: outlineOf(told['Plan']),
      ways: waysOf(told['Plan']),
    };
  });
