/** Which folders of shared/ each folder may import: the arrows of the map in DEVELOPERS.md. */
const sharedArrows = {
  units: [],
  geometry: [],
  body: ['units'],
  drafting: ['geometry', 'units'],
  drafts: ['drafting', 'geometry', 'body', 'units'],
  finishing: ['drafting', 'geometry', 'units'],
  proof: ['drafting', 'geometry', 'body', 'units'],
  engine: ['drafts', 'finishing', 'proof', 'drafting', 'geometry', 'body', 'units'],
  sheets: ['engine', 'drafting', 'geometry', 'units'],
  lesson: ['sheets', 'engine', 'drafting', 'geometry', 'body', 'units'],
  exports: [
    'lesson',
    'compare',
    'regrade',
    'sheets',
    'engine',
    'finishing',
    'proof',
    'drafts',
    'drafting',
    'geometry',
    'body',
    'units',
  ],
  compare: ['engine', 'proof', 'drafting', 'geometry', 'body', 'units'],
  regrade: ['compare', 'engine', 'proof', 'drafts', 'drafting', 'geometry', 'body', 'units'],
  api: [
    'engine',
    'sheets',
    'compare',
    'regrade',
    'proof',
    'drafts',
    'drafting',
    'geometry',
    'body',
    'units',
  ],
};

/** Packages that only some folders may name. */
const packageHomes = {
  paper: '^(shared/geometry/|src/.*/canvas/|tests/)',
  'clipper2-ts': '^(shared/geometry/|tests/)',
  zod: '^(shared/api/|src/|server/|tests/)',
  pg: '^(server/database/|tests/)',
  'drizzle-orm': '^(server/database/|server/features/[^/]+/[a-z-]*repository\\.ts$|tests/)',
  lucia: '^server/http/session\\.ts$',
  '@lucia-auth': '^server/http/session\\.ts$',
  oslo: '^server/http/(session|passwords)\\.ts$',
  express: '^(server/[^/]+\\.ts$|server/http/|server/features/[^/]+/router\\.ts$|tests/)',
  'pdf-lib': '^(server/features/print/|tests/)',
  fontkit: '^(server/features/print/|tests/)',
  react: '^(src/|tests/)',
};

/**
 * @param {string} name
 * @param {Record<string, string | string[]>} from
 * @param {Record<string, string | string[] | boolean>} to
 * @returns {import('dependency-cruiser').IForbiddenRuleType}
 */
const rule = (name, from, to) => ({ name, severity: 'error', from, to });

const inner = Object.entries(sharedArrows).map(([folder, may]) =>
  rule(
    `shared-${folder}`,
    { path: `^shared/${folder}/` },
    {
      path: '^(shared|server|src|tests|e2e)/',
      pathNot: `^shared/(${[folder, ...may].join('|')})/`,
    },
  ),
);

const homes = Object.entries(packageHomes).map(([name, home]) =>
  rule(`home-of-${name}`, { pathNot: [home, '^[^/]+$'] }, { path: `^node_modules/${name}/` }),
);

/** @type {import('dependency-cruiser').IConfiguration} */
export default {
  forbidden: [
    ...inner,
    ...homes,
    rule('no-circles', {}, { circular: true }),
    rule('nothing-unresolved', {}, { couldNotResolve: true }),
    rule('shared-is-pure', { path: '^shared/' }, { dependencyTypes: ['core'] }),
    rule(
      'server-draws-no-screens',
      { path: '^server/', pathNot: '^server/dev\\.ts$' },
      { path: '^(src|tests|e2e)/' },
    ),
    rule('screens-know-no-server', { path: '^src/' }, { path: '^(server|tests|e2e)/' }),
    rule(
      'features-stay-apart',
      { path: '^src/features/([^/]+)/' },
      { path: '^src/(features/|app/)', pathNot: '^src/features/$1/' },
    ),
    rule('controls-have-no-product', { path: '^src/(ui|lib)/' }, { path: '^src/(features|app)/' }),
    rule(
      'server-features-stay-apart',
      { path: '^server/features/([^/]+)/' },
      { path: '^server/features/', pathNot: '^server/features/$1/' },
    ),
    rule('journeys-see-only-the-screen', { path: '^e2e/' }, { path: '^(src|server/(?!ops))/' }),
    rule('tests-are-not-shipped', { path: '^(shared|server|src)/' }, { path: '^(tests|e2e)/' }),
  ],
  options: {
    doNotFollow: { path: '^node_modules' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tests/tsconfig.json' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
      extensions: ['.ts', '.tsx', '.mjs', '.js'],
    },
  },
};
