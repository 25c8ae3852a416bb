import js from '@eslint/js'
import reactHooks from 'eslint-plugin-react-hooks'
import globals from 'globals'
import tseslint from 'typescript-eslint'

/** Words that start an import path which a folder must not reach. */
const forbid = (groups, message) => ({
  'no-restricted-imports': ['error', { patterns: [{ regex: groups, message }] }],
})

const serverDomains =
  'accounts|districts|producers|jobs|surveys|designs|schedules|packets|signatures|reviews|uploads|mail|checkouts|inspections|reports'

export default tseslint.config(
  {
    ignores: [
      '**/dist/**',
      '**/.tsc/**',
      '**/node_modules/**',
      '.run/**',
      'out/**',
      'docker-free-db/data/**',
      'test-results/**',
      'playwright-report/**',
    ],
  },
  js.configs.recommended,
  {
    files: ['**/*.{js,mjs}'],
    languageOptions: { globals: globals.node },
  },
  {
    files: ['**/*.{ts,tsx}'],
    extends: [...tseslint.configs.recommended],
    rules: {
      '@typescript-eslint/consistent-type-definitions': ['error', 'interface'],
      '@typescript-eslint/no-explicit-any': 'error',
      'no-restricted-syntax': [
        'error',
        { selector: 'TSEnumDeclaration', message: 'Use a union of strings.' },
      ],
    },
  },
  {
    files: ['**/*.{ts,tsx,js,mjs}'],
    rules: {
      'max-lines': ['error', { max: 300, skipBlankLines: false, skipComments: false }],
      eqeqeq: 'error',
      'no-console': 'off',
    },
  },
  {
    files: ['**/src/**/*.ts'],
    ignores: ['**/*.test.ts', '**/*.spec.ts', '**/migrations/**'],
    rules: { 'max-lines-per-function': ['error', { max: 60, skipBlankLines: true, skipComments: true }] },
  },
  {
    files: ['client/src/**/*.tsx'],
    ignores: ['**/*.test.tsx'],
    rules: { 'max-lines-per-function': ['error', { max: 120, skipBlankLines: true, skipComments: true }] },
  },
  {
    files: ['**/migrations/*.ts'],
    rules: { 'max-lines-per-function': 'off' },
  },
  {
    files: ['shared/src/**/*.ts'],
    ignores: ['**/*.test.ts'],
    rules: {
      'no-restricted-globals': ['error', 'process', 'window', 'document', 'Buffer', 'fetch', 'setTimeout'],
      ...forbid('^(node:|react|@nestjs|@mui|server|client)', 'shared is pure: no Node, React or Nest.'),
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'shared is deterministic.' },
        { object: 'Date', property: 'now', message: 'The clock is an argument.' },
      ],
    },
  },
  {
    files: ['server/src/platform/**/*.ts'],
    rules: forbid(`^(\\.\\./)+(${serverDomains})/`, 'platform knows no domain word.'),
  },
  {
    files: ['server/src/*/*.ts', 'server/src/*/**/*.ts'],
    ignores: ['server/src/platform/**', '**/*.spec.ts'],
    rules: forbid(
      `^(\\.\\./)+(${serverDomains})/(?!.*(\\.module|\\.service|\\.entity|\\.dto)\\.js$)`,
      'A domain reaches another only through its exported module, service, entity or dto.',
    ),
  },
  {
    files: ['client/src/components/**/*.{ts,tsx}', 'client/src/api/**/*.{ts,tsx}'],
    rules: forbid('/(features|pages|app)/', 'components and api know neither features nor pages.'),
  },
  {
    files: ['client/src/features/**/*.{ts,tsx}'],
    rules: forbid(
      '(/pages/|/app/|^\\.\\./\\.\\./(?!components|api|i18n)|^\\.\\./(?!\\.\\.)[a-z-]+/[a-z-]+/)',
      'A feature imports components, api, i18n and shared, never another feature or a page.',
    ),
  },
  {
    files: ['client/src/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    rules: reactHooks.configs.recommended.rules,
  },
)
