/*
 * Who may import whom, as rules for dependency-cruiser. Each rule forbids; what no rule forbids is
 * allowed. A broken rule fails `npm run lint`, its comment says what to do instead.
 */

const ours = '^(apps|packages|fakes|e2e)/';
const shared = '^packages/shared/src/';
const api = '^apps/api/src/';
const web = '^apps/web/src/';
const test = '\\.test\\.tsx?$';

/** Files that never ship: tests, and what is there for tests. */
const onlyForTests = [test, '^(apps|packages)/.*/testing/'];

/** A package by its name, its types included. */
const packages = (...names) => `^node_modules/(@types/)?(${names.join('|')})/`;

/** Forbids `from` to import any file of ours that is not among `allowed`. */
const mayOnlyReach = (name, from, allowed, comment) => ({
  name,
  comment,
  severity: 'error',
  from: { path: from, pathNot: onlyForTests },
  to: { path: ours, pathNot: allowed },
});

const everywhere = [
  {
    name: 'no-circles',
    comment: 'Move what both need into a file of its own. (Types alone may go in circles.)',
    severity: 'error',
    from: {},
    to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } },
  },
  {
    name: 'no-barrels',
    comment: 'Import from the file that has it.',
    severity: 'error',
    from: {},
    to: { path: '/index\\.tsx?$', pathNot: '^node_modules/' },
  },
  {
    name: 'kebab-case',
    comment: 'Files are named in kebab-case.',
    severity: 'error',
    from: {},
    to: { path: '[A-Z_][^/]*\\.(ts|tsx|mjs)$', pathNot: '^node_modules/' },
  },
  {
    name: 'everything-resolves',
    comment: 'The file or package does not exist.',
    severity: 'error',
    from: {},
    to: { couldNotResolve: true },
  },
  {
    name: 'ships-without-dev-packages',
    comment: 'What ships may not use a package from devDependencies.',
    severity: 'error',
    from: { path: '^(apps|packages)/', pathNot: onlyForTests },
    to: { dependencyTypes: ['npm-dev'], dependencyTypesNot: ['type-only'] },
  },
  {
    name: 'ships-without-test-helpers',
    comment: 'What is under testing/ is for tests.',
    severity: 'error',
    from: { path: '^(apps|packages)/', pathNot: onlyForTests },
    to: { path: onlyForTests },
  },
];

const betweenParts = [
  {
    name: 'shared-is-pure',
    comment: 'shared runs anywhere: it imports no app, no Node module, only small pure packages.',
    severity: 'error',
    from: { path: shared, pathNot: onlyForTests },
    to: {
      pathNot: [shared, packages('zod', 'dinero\\.js', 'culori', '@date-fns/tz', 'date-fns__tz')],
    },
  },
  {
    name: 'shared-tests-stay-in-shared',
    comment: 'A test in shared tests shared.',
    severity: 'error',
    from: { path: shared },
    to: { path: ours, pathNot: shared },
  },
  {
    name: 'web-reaches-shared-only',
    comment: 'The page knows the API by its contracts alone, and no fake.',
    severity: 'error',
    from: { path: web },
    to: { path: ours, pathNot: [web, shared] },
  },
  {
    name: 'api-reaches-shared-only',
    comment: 'The API knows neither page nor fake; only its tests may talk to a fake.',
    severity: 'error',
    from: { path: api, pathNot: onlyForTests },
    to: { path: ours, pathNot: [api, shared] },
  },
  {
    name: 'api-tests-reach-fakes',
    comment: 'A test of the API may start a fake, but knows neither page nor journeys.',
    severity: 'error',
    from: { path: api },
    to: { path: ours, pathNot: [api, shared, '^fakes/'] },
  },
  {
    name: 'fakes-import-no-app',
    comment: 'A fake behaves as the real service does, which has never seen our code.',
    severity: 'error',
    from: { path: '^fakes/' },
    to: { path: '^(apps|e2e)/' },
  },
  {
    name: 'fakes-stay-apart',
    comment: 'Fakes share only what is under fakes/harness/.',
    severity: 'error',
    from: { path: '^fakes/([^/]+)/' },
    to: { path: '^fakes/[^/]+/', pathNot: ['^fakes/$1/', '^fakes/harness/'] },
  },
  {
    name: 'e2e-stays-outside',
    comment: 'Journeys use shared, api/testing, and a fake’s start and control client.',
    severity: 'error',
    from: { path: '^e2e/', pathNot: '^e2e/bench/' },
    to: {
      path: ours,
      pathNot: [
        '^e2e/',
        shared,
        `${api}testing/`,
        '^fakes/[^/]+/(control|start|wire)\\.ts$',
        '^fakes/[^/]+\\.mjs$',
      ],
    },
  },
];

const inWeb = [
  {
    name: 'web-ground-layers',
    comment: 'components, lib and config know no feature, page or app.',
    severity: 'error',
    from: { path: `${web}(components|lib|config)/` },
    to: { path: `${web}(features|routes|app)/` },
  },
  {
    name: 'web-ui-fetches-nothing',
    comment: 'The design system gets everything through its props.',
    severity: 'error',
    from: { path: `${web}components/ui/`, pathNot: test },
    to: {
      path: [`${web}lib/(http|query-client)\\.ts$`, packages('@tanstack/react-query')],
      // The type of an error may be known, so that it can be shown.
      dependencyTypesNot: ['type-only'],
    },
  },
  {
    name: 'web-features-below-pages',
    comment: 'Pages compose features, not the other way round.',
    severity: 'error',
    from: { path: `${web}features/` },
    to: { path: `${web}(routes|app)/` },
  },
  {
    name: 'web-features-stay-apart',
    comment: 'Compose two features in a page, or move what both need to components or lib.',
    severity: 'error',
    from: { path: `${web}features/([^/]+)/` },
    to: { path: `${web}features/`, pathNot: `${web}features/$1/` },
  },
  {
    name: 'web-pages-below-app',
    comment: 'The app’s router knows the pages, not the other way round.',
    severity: 'error',
    from: { path: `${web}routes/`, pathNot: onlyForTests },
    to: { path: `${web}app/` },
  },
];

const inApi = [
  {
    name: 'api-entries-on-top',
    comment: 'Nothing imports an entry but another entry.',
    severity: 'error',
    from: { pathNot: [`${api}entry/`, `${api}testing/`, test] },
    to: { path: `${api}entry/` },
  },
  mayOnlyReach(
    'api-http-below-entry',
    `${api}http/`,
    [shared, `${api}(http|modules|db|clients|outbox|platform)/`],
    'http mounts the modules; it knows no entry and writes no mail.',
  ),
  mayOnlyReach(
    'api-modules-below-http',
    `${api}modules/(?!.*\\.routes\\.ts$)`,
    [shared, `${api}(modules|db|clients|outbox|mail|platform)/`],
    'Only routes know http; pass what a command needs as an argument.',
  ),
  {
    name: 'api-routes-know-no-app',
    comment: 'http/app.ts mounts the routes, not the other way round.',
    severity: 'error',
    from: { path: `${api}modules/`, pathNot: onlyForTests },
    to: { path: `${api}(entry/|http/app\\.ts$)` },
  },
  {
    name: 'api-modules-stay-apart',
    comment: 'A module reaches another only through its queries and commands.',
    severity: 'error',
    from: { path: `${api}modules/([^/]+)/`, pathNot: onlyForTests },
    to: {
      path: `${api}modules/[^/]+/`,
      pathNot: [`${api}modules/$1/`, '\\.(queries|command)\\.ts$'],
    },
  },
  mayOnlyReach(
    'api-outbox-below-modules',
    `${api}outbox/`,
    [shared, `${api}(outbox|db|clients|mail|platform)/`],
    'Modules write the rows and make the handlers; the entry hands these to the dispatcher.',
  ),
  mayOnlyReach(
    'api-mail-below-outbox',
    `${api}mail/`,
    [shared, `${api}(mail|db|platform)/`],
    'Mail is made from rows and sends nothing itself.',
  ),
  mayOnlyReach(
    'api-db-on-the-ground',
    `${api}db/`,
    [shared, `${api}(db|platform)/`],
    'The database knows nothing of what uses it.',
  ),
  mayOnlyReach(
    'api-clients-on-the-ground',
    `${api}clients/`,
    [shared, `${api}(clients|platform)/`],
    'An adapter knows its service and nothing else of ours.',
  ),
  mayOnlyReach(
    'api-platform-on-the-ground',
    `${api}platform/`,
    [shared, `${api}platform/`],
    'platform imports nothing of ours but shared.',
  ),
  {
    name: 'api-express-in-http-and-routes',
    comment: 'Only http and *.routes.ts know Express.',
    severity: 'error',
    from: {
      path: api,
      pathNot: [`${api}http/`, '\\.routes\\.ts$', ...onlyForTests],
    },
    to: { path: packages('express', 'express-serve-static-core') },
  },
];

export default {
  forbidden: [...everywhere, ...betweenParts, ...inWeb, ...inApi],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '^dist/' },
    tsConfig: { fileName: 'tsconfig.json' },
    // Types count too: knowing a type is knowing the other side.
    tsPreCompilationDeps: true,
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['types', 'import', 'node', 'default', 'require'],
    },
  },
};
