/**
 * Who may import whom, as a closed list: folder → folders it may import besides itself. DEVELOPERS.md has the picture;
 * this file is what holds. `import type`, `@/…` and relative paths all count.
 */
const core = {
  'lib/base': [],
  'lib/geometry': ['lib/base'],
  'lib/report': ['lib/base'],
  'lib/job': ['lib/base', 'lib/report'],
  'lib/outline': ['lib/base', 'lib/geometry', 'lib/job', 'lib/report'],
  'lib/import': ['lib/base', 'lib/geometry', 'lib/job', 'lib/report'],
  'lib/moves': ['lib/base', 'lib/geometry'],
  'lib/plan': ['lib/base', 'lib/geometry', 'lib/job', 'lib/report', 'lib/outline', 'lib/moves'],
  'lib/gcode/write': ['lib/base', 'lib/geometry', 'lib/job', 'lib/report', 'lib/moves'],
  'lib/gcode/read': ['lib/base', 'lib/geometry'],
  // The proof reads the text; it may not know the code that made it.
  'lib/proof': ['lib/base', 'lib/geometry', 'lib/job', 'lib/report', 'lib/outline', 'lib/gcode/read'],
  'lib/pipeline': [
    'lib/base',
    'lib/geometry',
    'lib/job',
    'lib/report',
    'lib/outline',
    'lib/moves',
    'lib/plan',
    'lib/gcode',
    'lib/proof',
  ],
  'lib/contracts': ['lib/base', 'lib/job', 'lib/report'],
};
const pure = Object.keys(core);

const allow = {
  ...core,
  'lib/editor': pure,
  'lib/worker': pure,
  'lib/client': [...pure, 'lib/editor', 'lib/worker'],
  entities: ['lib/base', 'lib/job', 'lib/report', 'lib/contracts'],
  'lib/server': [...pure, 'entities', 'mikro-orm.config.ts', 'migrations'],
  'components/ui': ['lib/base'],
  'components/canvas': [...pure, 'lib/editor', 'components/ui'],
};

const zones = Object.entries(allow).map(([target, may]) => ({
  target: `./${target}`,
  from: '.',
  except: [target, ...may, 'node_modules'].map((path) => `./${path}`),
  message: `${target} may import: ${may.join(', ') || 'nothing'}`,
}));
zones.push(
  {
    target: './components',
    from: ['./lib/server', './entities', './migrations', './app'],
    message: 'no server code in components',
  },
  {
    target: './app/**/!(page|layout|route|template|default|actions|sitemap|robots|opengraph-image).{ts,tsx}',
    from: './lib/server/**/*',
    message: 'only page, layout, route and actions files talk to the server',
  },
  { target: './app', from: ['./entities', './migrations'], message: 'go through lib/server' },
);

const corePackages = '^(?!@/|\\.{1,2}/|(?:zod|clipper-lib|opentype\\.js|saxes|delaunator|flatbush)$)';
const editorPackages = '^(?!@/|\\.{1,2}/|(?:zod|zustand/vanilla|flatbush)$)';

const noHost = {
  'no-restricted-globals': [
    'error',
    'window',
    'document',
    'localStorage',
    'fetch',
    'performance',
    'process',
    'setTimeout',
    'setInterval',
    'console',
    'crypto',
  ],
  'no-restricted-properties': [
    'error',
    { object: 'Date', property: 'now' },
    { object: 'Math', property: 'random' },
  ],
  'no-restricted-syntax': [
    'error',
    { selector: "NewExpression[callee.name='Date'][arguments.length=0]", message: 'no clock in the core' },
  ],
};
const inFolders = (folders) => folders.map((path) => `${path}/**/*.{ts,tsx}`);

// eslint-config-next brings the import plugin and registers it; its rules are only switched on here.
export const boundaries = [
  {
    files: ['**/*.{ts,tsx}'],
    settings: {
      'import/resolver': { typescript: true, node: true },
      'import/parsers': { '@typescript-eslint/parser': ['.ts', '.tsx'] },
    },
    rules: { 'import/no-restricted-paths': ['error', { zones }], 'import/no-cycle': 'error' },
  },
  {
    files: inFolders(pure),
    rules: {
      ...noHost,
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            {
              regex: corePackages,
              message: 'the core uses only zod, clipper-lib, opentype.js, saxes, delaunator, flatbush',
            },
          ],
        },
      ],
    },
  },
  {
    files: inFolders(['lib/editor']),
    rules: {
      ...noHost,
      'no-restricted-imports': [
        'error',
        { patterns: [{ regex: editorPackages, message: 'the editor knows no React and no konva' }] },
      ],
    },
  },
];
