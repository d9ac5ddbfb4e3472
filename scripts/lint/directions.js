// Which way imports may point: client → shared ← api; routes → service → repository → entity; in shared,
// calculations know nothing of sheets, sheets may call calculations, drawings may read their answers, and
// workings put both before somebody without a sheet.
// Read by eslint.config.js.
import { readdirSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('../../', import.meta.url));

const foldersIn = (path) =>
  readdirSync(new URL(`../../${path}`, import.meta.url), { withFileTypes: true })
    .filter((entry) => entry.isDirectory())
    .map((entry) => entry.name);

const packages = [
  { target: './client', from: './api', message: 'Client and api meet only in shared.' },
  { target: './api', from: './client', message: 'Client and api meet only in shared.' },
  { target: './shared', from: ['./api', './client'], message: 'Shared knows neither client nor api.' },
];

const layers = [
  ['routes', ['repository', 'entity', 'mapper'], 'Routes call services.'],
  ['service', ['routes'], 'A service knows nothing of routes.'],
  ['repository', ['routes', 'service', 'dto'], 'A repository knows only entities.'],
  ['entity', ['routes', 'service', 'repository', 'dto', 'mapper'], 'An entity knows only entities.'],
  ['dto', ['routes', 'service', 'repository', 'entity'], 'A DTO is only the shape of a request.'],
  ['mapper', ['routes', 'service', 'repository'], 'A mapper only turns a row into a contract type.'],
].map(([layer, forbidden, message]) => ({
  target: `./api/src/**/*.${layer}.ts`,
  from: `./api/src/**/*.{${forbidden.join(',')}}.ts`,
  message,
}));

const featureWalls = () =>
  foldersIn('api/src')
    .filter((feature) => feature !== 'platform')
    .map((feature) => ({
      target: `./api/src/${feature}/**/!(*.entity|*.spec).ts`,
      from: `./api/src/!(${feature}|platform)/**/*.{routes,repository,entity,mapper}.ts`,
      message: 'One feature reaches another through its service.',
    }));

const calculations = '!(quantities|drawing|sheet|contracts|workings)';
const above = ['sheet', 'drawing', 'workings'];

const wall = (targets, sources, message) => ({
  target: targets.map((folder) => `./shared/src/${folder}/**/*.ts`),
  from: sources.map((folder) => `./shared/src/${folder}/**/*.ts`),
  message,
});

const insideShared = [
  wall([calculations], above, 'Calculations know nothing of sheets, drawings and workings.'),
  wall(['drawing'], ['sheet', 'workings'], 'A drawing is made from a calculation, not from a sheet.'),
  wall(['workings'], ['sheet'], 'Workings need no sheet.'),
  wall(['sheet'], ['workings'], 'A sheet asks the calculations themselves.'),
  wall(['quantities'], [calculations, ...above], 'Quantities stand below everything.'),
  wall(['contracts'], [calculations, ...above], 'Contracts are types alone.'),
];

/** The walls between packages, layers and features, as they stand in the folders at hand. */
export const directions = () => ({
  files: ['{shared,api,client}/**/*.ts'],
  rules: {
    'import-x/no-restricted-paths': [
      'error',
      { basePath: root, zones: [...packages, ...layers, ...featureWalls(), ...insideShared] },
    ],
  },
});

const onlyIn = (files, ignores, pattern) => ({
  files,
  ignores,
  rules: { 'no-restricted-imports': ['error', { patterns: [pattern] }] },
});

/** Which packages may be imported where. */
export const packageWalls = [
  onlyIn(['shared/src/**/*.ts'], ['**/*.spec.ts'], {
    regex: '^(?!\\.{1,2}/|mathjs(/|$)|convert-units(/|$))',
    message: 'Shared imports only mathjs and convert-units.',
  }),
  onlyIn(['shared/src/**/*.spec.ts'], [], {
    regex: '^(?!\\.{1,2}/|mathjs(/|$)|convert-units(/|$)|vitest$|fast-check$|node:)',
    message: "Tests in shared add only vitest, fast-check and Node's own modules.",
  }),
  onlyIn(['api/**/*.ts'], ['api/src/**/*.{repository,entity}.ts', 'api/src/platform/database/**'], {
    regex: '^(typeorm(/|$)|mathjs(/|$)|convert-units(/|$)|@angular/|@second-spanner/client)',
    message: 'Only repositories, entities and platform/database import typeorm; only shared computes.',
  }),
  onlyIn(['api/src/**/*.{repository,entity}.ts', 'api/src/platform/database/**'], [], {
    regex: '^(mathjs(/|$)|convert-units(/|$)|@angular/|@second-spanner/client)',
    message: 'Only shared computes; the api knows nothing of the client.',
  }),
  onlyIn(['client/**/*.ts'], [], {
    regex: '^(mathjs(/|$)|convert-units(/|$)|typeorm(/|$)|express(/|$)|@second-spanner/api)',
    message: 'Only shared computes; the client knows nothing of the api.',
  }),
];
