const path = require('node:path');
const { defineConfig, globalIgnores } = require('eslint/config');
const expo = require('eslint-config-expo/flat');

/** Who may import whom (see DEVELOPERS.md): each room, and the rooms it may reach besides itself. */
const rooms = {
  app: ['components', 'hooks', 'api/contracts'],
  components: ['hooks', 'api/contracts', 'api/geometry'],
  'components/theme': [],
  'components/ui': ['components/theme'],
  'components/forms': ['components/ui', 'components/theme', 'api/contracts'],
  'components/diagram': ['components/theme', 'api/contracts', 'api/geometry'],
  hooks: ['api/contracts', 'api/engine'],
  'api/contracts': ['api/engine'],
  'api/engine': [],
  'api/geometry': ['api/engine'],
  'api/documents': ['api/contracts', 'api/engine', 'api/geometry', 'assets'],
  'api/services': [
    'api/contracts',
    'api/engine',
    'api/documents',
    'api/errors.ts',
    'api/adapters',
    'db/repositories',
    'db/with-firm.ts',
  ],
  'api/routes': ['api/contracts', 'api/services', 'api/errors.ts', 'api/engine/engine-error.ts'],
  'api/queue': ['api/services', 'api/adapters', 'db/queues.ts', 'db/with-firm.ts'],
  'db/*.ts': ['db', 'api/contracts', 'knexfile.ts'],
  'db/migrations': ['db/firm-wall.ts', 'db/firm-rows.ts'],
  'db/repositories': ['api/contracts'],
  'db/seeds': ['api/contracts', 'api/engine', 'api/services', 'api/adapters'],
};
const everything = ['app', 'components', 'hooks', 'api', 'db', 'scripts', 'assets', '__tests__', 'knexfile.ts'];

const zones = Object.entries(rooms)
  .flatMap(([room, reachable]) =>
    everything.map((from) => ({
      target: `./${room}`,
      from: `./${from}`,
      except: [room, ...reachable]
        .filter((name) => name === from || name.startsWith(`${from}/`))
        .map((name) => `./${path.relative(from, name)}`),
      message: `${room} may import only: itself${reachable.map((name) => `, ${name}`).join('')}.`,
    })),
  )
  .filter(({ except }) => !except.includes('./'));

module.exports = defineConfig([
  globalIgnores(['dist', 'build', '.data', '.expo', 'public', 'expo-env.d.ts']),
  expo,
  {
    rules: {
      // fast-check's own way: fc.assert(fc.property(...))
      'import/no-named-as-default-member': 'off',
      // says only that the compiler skips a component, which says so itself
      'react-hooks/incompatible-library': 'off',
    },
  },
  { linterOptions: { reportUnusedDisableDirectives: 'error' } },
  {
    files: ['**/*.{ts,tsx}'],
    rules: {
      'import/no-restricted-paths': ['error', { basePath: __dirname, zones }],
      'import/no-cycle': ['error', { ignoreExternal: true }],
      'import/no-default-export': 'error',
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/consistent-type-assertions': ['error', { assertionStyle: 'never' }],
      '@typescript-eslint/consistent-type-imports': 'error',
      complexity: ['error', 10],
      'max-lines': ['error', 250],
      'max-lines-per-function': ['error', 80],
      'max-params': ['error', 3],
    },
  },
  {
    files: ['app/**', 'knexfile.ts', 'playwright.config.ts', 'db/seeds/**'],
    rules: { 'import/no-default-export': 'off' },
  },
  // what draws is one chunk of its own (components/drawing says why)
  {
    files: ['app/**', 'components/**'],
    ignores: ['components/diagram/**', 'components/drawing/**', 'components/study/{strip-*,thickness-strip}.*'],
    rules: {
      '@typescript-eslint/no-restricted-imports': [
        'error',
        {
          patterns: [
            { group: ['react-native-svg', '@/components/diagram/**'], message: 'Take it from components/drawing.' },
          ],
        },
      ],
    },
  },
  // the engine is pure: no package and no Node
  {
    files: ['api/engine/**'],
    rules: { 'no-restricted-imports': ['error', { patterns: [{ regex: '^(?!\\.|@/api/engine/)' }] }] },
  },
  { files: ['api/services/**'], rules: { 'no-restricted-imports': ['error', { paths: ['express', 'knex', 'pg'] }] } },
  // a service knows a repository by its type only
  {
    files: ['api/services/**'],
    rules: {
      '@typescript-eslint/no-restricted-imports': [
        'error',
        { patterns: [{ group: ['@/db/**', '@/api/adapters/**'], allowTypeImports: true }] },
      ],
    },
  },
  {
    files: ['**/*.{js,mjs}', '__tests__/support/**'],
    languageOptions: { globals: { __dirname: 'readonly', fetch: 'readonly', Buffer: 'readonly' } },
  },
]);
