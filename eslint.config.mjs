import next from 'eslint-config-next/core-web-vitals'
import typescript from 'eslint-config-next/typescript'

/*
 * Imports go down, never up (DEVELOPERS.md, "Floors"). Each zone names a floor, what it may not reach, and why.
 * `from` lists what is forbidden; anything not listed is allowed.
 */
const floors = {
  knowledge: ['./lib/species', './lib/rules', './lib/states', './lib/schemas', './lib/planning'],
  faces: ['./lib/policies', './lib/views', './lib/documents'],
  storage: ['./models', './lib/db', './lib/env.ts'],
  verbs: ['./lib/domain', './lib/auth', './lib/mail', './lib/signing.ts'],
  edge: ['./lib/action.ts', './lib/route.ts', './lib/local', './lib/workers', './app'],
  client: ['./components'],
}
const { knowledge, faces, storage, verbs, edge, client } = floors
const zone = (target, from, message) => ({ target, from, message })

const zones = [
  zone(
    ['./lib/thermal', './lib/errors.ts', './lib/tokens.ts'],
    [...knowledge, ...faces, ...storage, ...verbs, ...edge, ...client],
    'The ground floor imports nothing of ours.',
  ),
  zone(
    knowledge,
    [...faces, ...storage, ...verbs, ...edge, ...client],
    'Knowledge imports only the ground floor and itself.',
  ),
  zone(faces, [...verbs, ...edge, ...client], 'Faces are pure: ground, knowledge, and types of rows.'),
  zone(storage, [...faces, ...verbs, ...edge, ...client], 'Storage imports ground and knowledge only.'),
  zone(verbs, [...edge, ...client], 'Verbs never import the edge.'),
  zone(client, [...storage, ...verbs, ...edge], 'Components take views and actions as props.'),
]

const config = [
  {
    ignores: [
      '.next/**',
      'dist/**',
      'node_modules/**',
      '.data/**',
      'next-env.d.ts',
      'test-results/**',
      'playwright-report/**',
    ],
  },
  ...next,
  ...typescript,
  {
    settings: { 'import/resolver': { typescript: true, node: true } },
    rules: {
      'import/no-restricted-paths': ['error', { zones }],
      'import/no-cycle': ['error', { ignoreExternal: true }],
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      'no-console': 'error',
    },
  },
  {
    // The type checker sees no .mjs file.
    files: ['**/*.mjs'],
    rules: { 'no-undef': 'error' },
  },
  {
    files: ['lib/thermal/**', 'lib/rules/**', 'lib/planning/**', 'lib/species/**'],
    rules: {
      'no-restricted-globals': ['error', 'process', 'fetch', 'setTimeout', 'window', 'document'],
    },
  },
  {
    files: ['lib/thermal/**', 'lib/rules/**'],
    rules: {
      'no-restricted-globals': [
        'error',
        'process',
        'fetch',
        'setTimeout',
        'window',
        'document',
        'Date',
        'performance',
      ],
      'no-restricted-properties': [
        'error',
        ...[
          'random',
          'exp',
          'log',
          'log2',
          'log10',
          'log1p',
          'expm1',
          'pow',
          'sin',
          'cos',
          'tan',
          'asin',
          'acos',
          'atan',
          'atan2',
          'cbrt',
          'tanh',
          'sinh',
          'cosh',
          'hypot',
        ].map((property) => ({
          object: 'Math',
          property,
          message: 'Engines differ in the last bit: use lib/thermal/elementary.ts.',
        })),
      ],
      'no-restricted-syntax': [
        'error',
        { selector: "BinaryExpression[operator='**']", message: 'Use pow of lib/thermal/elementary.ts.' },
      ],
    },
  },
  {
    files: ['lib/local/**', 'lib/workers/**', 'seeders/**', 'migrations/**', 'tests/**'],
    rules: { 'no-console': 'off' },
  },
]

export default config
