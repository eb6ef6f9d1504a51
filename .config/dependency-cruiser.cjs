/** The import rules of the book: each folder may import only what stands before it. */
const sharedOrder = [
  'lib', 'electrics', 'wire-colours', 'members', 'text', 'pages', 'blocks', 'loom', 'drawing', 'dialect', 'trust',
  'proposals', 'builds', 'search', 'contracts',
];
const serverOrder = ['members', 'pages', 'trust', 'proposals', 'builds'];
const siteOrder = ['lib', 'ui', 'blocks', 'features', 'app'];
const tests = '\\.test\\.tsx?$';

/** Forbids each folder of a list to import from those after it. */
function layers(root, order) {
  return order.slice(0, -1).map((name, index) => ({
    name: `${root}-${name}-imports-only-what-stands-before-it`,
    severity: 'error',
    from: { path: `^${root}/${name}/`, pathNot: tests },
    to: { path: `^${root}/(${order.slice(index + 1).join('|')})/` },
  }));
}

module.exports = {
  forbidden: [
    { name: 'no-cycles', severity: 'error', from: {}, to: { circular: true } },
    { name: 'shared-is-pure', severity: 'error', from: { path: '^shared/', pathNot: tests }, to: { path: '^(server|src|tests)/' } },
    { name: 'shared-has-no-node', severity: 'error', from: { path: '^shared/', pathNot: tests }, to: { dependencyTypes: ['core'] } },
    { name: 'site-never-imports-server', severity: 'error', from: { path: '^src/' }, to: { path: '^server/' } },
    {
      name: 'only-the-renderer-crosses-from-server-to-site',
      severity: 'error',
      from: { path: '^server/', pathNot: '^server/http/ssr' },
      to: { path: '^src/' },
    },
    {
      name: 'the-renderer-crosses-at-one-place',
      severity: 'error',
      from: { path: '^server/http/ssr' },
      to: { path: '^src/', pathNot: '^src/entry-server' },
    },
    { name: 'nothing-imports-tests', severity: 'error', from: { path: '^(shared|server|src)/', pathNot: tests }, to: { path: '^tests/' } },
    {
      name: 'features-never-import-each-other',
      severity: 'error',
      from: { path: '^src/features/([^/]+)/' },
      to: { path: '^src/features/([^/]+)/', pathNot: '^src/features/$1/' },
    },
    {
      name: 'routes-do-not-reach-stores',
      severity: 'error',
      from: { path: '^server/.*-routes\\.ts$' },
      to: { path: '^server/.*-store\\.ts$|^server/db/' },
    },
    {
      name: 'stores-reach-only-the-database',
      severity: 'error',
      from: { path: '^server/.*-store\\.ts$' },
      to: { path: '^server/.*-(service|routes)\\.ts$' },
    },
    ...layers('shared', sharedOrder),
    ...layers('server', serverOrder),
    ...layers('src', siteOrder),
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '(^|/)(node_modules|dist)/' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    enhancedResolveOptions: { extensions: ['.ts', '.tsx', '.js', '.mjs', '.json'], conditionNames: ['import', 'node', 'default', 'types'] },
  },
};
