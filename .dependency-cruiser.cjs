const path = require('node:path');

/**
 * Rings of the server, innermost first: a module may import its own ring or one further in, never outwards.
 * The seeds stand outside all of them and may import every module.
 */
const RINGS = [
  ['numerics'],
  ['units', 'common', 'config', 'database', 'jobs', 'mail', 'storage'],
  ['people', 'substances'],
  ['auth', 'api-keys', 'pairs', 'files'],
  ['series'],
  ['bring-in', 'fits'],
  ['data-sheets'],
  ['sheet-documents', 'registrar', 'subscriptions'],
  ['reviews', 'releases'],
  ['exports', 'home', 'health', 'nodes', 'pages'],
];

const inRing = (modules) => `^server/src/(${modules.join('|')})/`;
const forbid = (name, from, to) => ({ name, severity: 'error', from, to });

module.exports = {
  forbidden: [
    forbid('no-cycles', {}, { circular: true }),
    forbid(
      'numerics-is-pure',
      { path: '^server/src/numerics/', pathNot: '\\.spec\\.ts$' },
      { pathNot: ['^server/src/numerics/', 'node_modules/(ml-[^/]+|@stdlib)/'] },
    ),
    forbid('rules-are-pure', { path: '-rules\\.ts$' }, { path: 'node_modules|\\.(service|resolver|entity)\\.ts$' }),
    forbid(
      'services-know-no-graphql',
      { path: '\\.service\\.ts$' },
      { path: '@nestjs/graphql|\\.(resolver|payload)\\.ts$' },
    ),
    forbid(
      'features-do-not-meet',
      { path: '^client/src/features/([^/]+)/' },
      {
        path: '^client/src/features/',
        pathNot: '^client/src/features/$1/',
      },
    ),
    forbid('ui-knows-no-domain', { path: '^client/src/(ui|lib)/' }, { path: '^client/src/(features|routes)/' }),
    forbid('client-and-server-are-strangers', { path: '^client/' }, { path: '^server/' }),
    forbid('server-and-client-are-strangers', { path: '^server/' }, { path: '^client/' }),
    forbid(
      'src-knows-no-seeds',
      { path: '^server/src/', pathNot: '^server/src/main\\.ts$' },
      { path: '^server/seeds/' },
    ),
    ...RINGS.slice(0, -1).map((ring, i) =>
      forbid(
        `ring-${i}-stays-inside`,
        { path: inRing(ring), pathNot: '\\.spec\\.ts$' },
        { path: inRing(RINGS.slice(i + 1).flat()) },
      ),
    ),
  ],
  options: {
    tsPreCompilationDeps: true,
    tsConfig: { fileName: path.join(__dirname, 'server/tsconfig.spec.json') },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
    },
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '(^|/)dist/' },
  },
};
