// Who may import whom: the table in DEVELOPERS.md, layer by layer. Type-only imports count like others, except where a
// rule says otherwise.

/** @param {string[]} folders below server/ */
const server = (...folders) => folders.map((folder) => `^server/${folder}(/|\\.ts$)`);

/** Every part of server/ that a layer may import from; all may use the errors and the like. */
const EVERYWHERE = ['env', 'errors', 'types', 'security'];

/**
 * @param {string} layer
 * @param {string[]} allowed other folders of server/
 * @param {string[]} [typesOnly] folders of server/ of which only types are allowed
 */
function layer(layer, allowed, typesOnly = []) {
  const rules = [
    {
      name: `server-${layer}`,
      comment: `server/${layer} may import ${allowed.join(', ') || 'nothing else'} of the server.`,
      severity: 'error',
      from: { path: `^server/${layer}/` },
      to: { path: '^server/', pathNot: server(layer, ...EVERYWHERE, ...allowed, ...typesOnly) },
    },
  ];
  if (typesOnly.length === 0) return rules;
  return [
    ...rules,
    {
      name: `server-${layer}-types-only`,
      comment: `server/${layer} asks the database nothing: of ${typesOnly.join(', ')} only types.`,
      severity: 'error',
      from: { path: `^server/${layer}/` },
      to: { path: server(...typesOnly), dependencyTypesNot: ['type-only'] },
    },
  ];
}

/**
 * @param {string} name
 * @param {string} comment
 * @param {string | string[]} from
 * @param {object} to
 */
const never = (name, comment, from, to) => ({ name, comment, severity: 'error', from: { path: from }, to });

const TOP = ['src', 'server', 'labels', 'shared', 'tests', 'scripts'];
/** @param {string[]} kept */
const topFoldersBut = (...kept) => `^(${TOP.filter((folder) => !kept.includes(folder)).join('|')})/`;

module.exports = {
  forbidden: [
    {
      name: 'no-cycles',
      comment: 'Two files that need each other are one file, or need a third.',
      severity: 'error',
      from: {},
      to: { circular: true },
    },
    {
      name: 'no-unresolved',
      comment: 'The imported file or package does not exist.',
      severity: 'error',
      from: {},
      to: { couldNotResolve: true },
    },
    never('shared-is-pure', 'shared/ runs anywhere.', '^shared/', { path: topFoldersBut('shared') }),
    never('shared-without-node', 'shared/ runs in the browser too.', '^shared/', {
      dependencyTypes: ['core'],
    }),
    never(
      'shared-packages',
      'Of packages, shared/ knows zod and the canonical form of JSON.',
      '^shared/(?!reader/)',
      {
        path: 'node_modules/',
        pathNot: 'node_modules/(zod|zod-openapi|canonicalize)/',
      },
    ),
    never('reader-packages', 'The reading of codes is built on one decoder.', '^shared/reader/', {
      path: 'node_modules/',
      pathNot: 'node_modules/@zxing/library/',
    }),
    never('domain-knows-no-schemas', 'The trade does not know how it is sent.', '^shared/domain/', {
      path: ['^shared/schemas/', 'node_modules/zod'],
    }),
    never('labels-import-shared-only', 'labels/ knows neither pages nor server.', '^labels/', {
      path: topFoldersBut('labels', 'shared'),
    }),
    never('label-layout-before-rendering', 'The layout is numbers; it knows no PDF.', '^labels/layout/', {
      path: '^labels/render/',
    }),
    never('pages-import-shared-only', 'Pages and server meet in shared/schemas and over HTTP.', '^src/', {
      path: topFoldersBut('src', 'shared'),
    }),
    never('pages-without-node', 'There is no Node in a browser.', '^src/', { dependencyTypes: ['core'] }),
    never(
      'server-never-imports-pages',
      'Pages and server meet in shared/schemas and over HTTP.',
      '^server/',
      {
        path: topFoldersBut('server', 'shared', 'labels'),
      },
    ),
    never(
      'nothing-imports-tests',
      'What tests need is not in the product.',
      '^(src|server|shared|labels|scripts)/',
      {
        path: '^tests/',
      },
    ),
    never(
      'features-stay-apart',
      'Pages in src/app compose features; one never imports another.',
      '^src/features/([^/]+)/',
      {
        path: '^src/features/',
        pathNot: '^src/features/$1/',
      },
    ),
    never('features-below-app', 'A feature does not know where it is shown.', '^src/features/', {
      path: '^src/app/',
    }),
    never('base-below-features', 'Generic parts know no feature.', '^src/(components|lib|config)/', {
      path: '^src/(features|app)/',
    }),
    ...layer('routes', [
      'openapi',
      'routing',
      'middleware',
      'policies',
      'commands',
      'queries',
      'presenters',
      'models',
      'context',
      'files',
      'events',
    ]),
    ...layer('middleware', ['models', 'context', 'routing']),
    ...layer('commands', ['models', 'policies', 'events', 'queries', 'context', 'files', 'jobs']),
    ...layer('queries', ['models', 'context']),
    ...layer('policies', ['context'], ['models']),
    ...layer('presenters', ['policies'], ['models', 'queries']),
    ...layer('models', ['db']),
    ...layer('events', []),
    ...layer('db', ['migrations']),
    ...layer('migrations', []),
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '^(dist|dist-server|pictures|docs)/' },
    tsPreCompilationDeps: true, // sees type-only imports too
    tsConfig: { fileName: 'tsconfig.json' },
    enhancedResolveOptions: {
      extensions: ['.ts', '.tsx', '.mjs', '.js', '.json'],
      exportsFields: ['exports'],
      conditionNames: ['import', 'types', 'node', 'default'],
    },
  },
};
