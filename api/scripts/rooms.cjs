/**
 * Which room may import from which, and no cycles. A pattern ("the same feature as mine", $1) stands in for a list of
 * features, so a new feature needs no line here.
 * @type {import('dependency-cruiser').IConfiguration}
 */
const FEATURE = '^api/src/(?!common|config|database)([^/]+)/';
const SPECS = '\\.(spec|test)\\.tsx?$';

module.exports = {
  forbidden: [
    {
      name: 'no-cycles',
      severity: 'error',
      from: {},
      to: { circular: true, dependencyTypesNot: ['type-only'] },
    },
    {
      name: 'levels-stand-alone',
      severity: 'error',
      // What its specs and benchmark need of Node lies apart from the package.
      from: { path: '^api/levels/', pathNot: [SPECS, '^api/levels/(testing|bench)/'] },
      to: { pathNot: '^api/levels/' },
    },
    {
      name: 'common-leans-on-nobody',
      severity: 'error',
      from: { path: '^api/src/(common|config)/' },
      to: { path: '^api/src/(?!common|config)' },
    },
    {
      name: 'features-meet-through-services-and-entities',
      comment:
        "Another feature's tables and rules are private: use its exported service, its module, its DTOs, or its entity for a foreign key.",
      severity: 'error',
      from: { path: FEATURE, pathNot: SPECS },
      to: {
        path: FEATURE,
        pathNot: [
          '^api/src/$1/',
          '\\.(service|module|entity)\\.ts$',
          '\\.dto\\.ts$',
          '^api/src/auth/(passwords|cookies)\\.ts$',
          '^api/src/mail/mail-carrier\\.ts$',
        ],
      },
    },
    {
      name: 'rules-are-pure',
      severity: 'error',
      from: { path: '\\.rules\\.ts$' },
      to: {
        path: ['node_modules/(@nestjs|typeorm|pg|express)', '\\.(service|controller|module)\\.ts$'],
        dependencyTypesNot: ['type-only'],
      },
    },
    {
      name: 'portal-lib-is-plain',
      severity: 'error',
      from: { path: '^portal/src/lib/', pathNot: SPECS },
      to: { path: ['node_modules/(react|@mui)', '^portal/src/(?!lib)'] },
    },
    {
      name: 'portal-api-client-has-no-screen',
      severity: 'error',
      from: { path: '^portal/src/api-client/', pathNot: SPECS },
      to: { path: ['node_modules/(@mui|react-router)', '^portal/src/(?!lib|api-client)'] },
    },
    {
      name: 'portal-shared-ui-is-ignorant',
      severity: 'error',
      from: { path: '^portal/src/shared-ui/', pathNot: SPECS },
      to: { path: '^portal/src/(?!lib|shared-ui)', pathNot: '^portal/src/api-client/problem' },
    },
    {
      name: 'portal-features-do-not-meet',
      comment: 'Compose two features in app/.',
      severity: 'error',
      from: { path: '^portal/src/features/([^/]+)/', pathNot: SPECS },
      to: { path: ['^portal/src/app/', '^portal/src/features/'], pathNot: '^portal/src/features/$1/' },
    },
    {
      name: 'the-browser-never-imports-the-server',
      severity: 'error',
      from: { path: '^portal/' },
      to: { path: '^(api/(?!levels)|seeds|fakes)' },
    },
    {
      name: 'fakes-share-nothing',
      severity: 'error',
      from: { path: '^fakes/' },
      to: { path: '^(api|portal|seeds)/' },
    },
    {
      name: 'only-specs-use-test-helpers',
      severity: 'error',
      from: { path: '^(api/src|portal/src/(?!testing))', pathNot: SPECS },
      to: { path: '^(api/test|portal/src/testing)/' },
    },
    { name: 'resolvable', severity: 'error', from: {}, to: { couldNotResolve: true } },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '(^|/)dist/' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'api/tsconfig.json' },
    enhancedResolveOptions: {
      conditionNames: ['@ferrite-row/source', 'import', 'require', 'node', 'default', 'types'],
      exportsFields: ['exports'],
    },
  },
};
