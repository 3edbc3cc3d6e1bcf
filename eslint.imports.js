/**
 * Who may import whom (see DEVELOPERS.md). Patterns for `#…` imports must be `regex`: a `group` pattern that
 * begins with `#` is read as a comment and matches nothing. tests/repo proves that each rule bites.
 */
const ban = (regex, message) => ({ regex, message })
const NODE = ban('^node:', 'shared/ runs anywhere: no Node modules here.')
const outside = (...allowed) => `^(?!(?:\\.|${allowed.join('|')}))`

const pureLibraries = ['simple-statistics', 'jstat', 'ml-matrix', 'ml-pca', '@noble/hashes']

/** One rule block: the files it is about and the import patterns refused there. */
const block = (files, patterns, ignores = []) => ({
  files,
  ignores,
  rules: { 'no-restricted-imports': ['error', { patterns }] },
})

const pure = (folder) =>
  block(
    [`shared/${folder}/**/*.ts`],
    [
      ban(
        outside(`#shared/${folder}/`, ...pureLibraries),
        `shared/${folder} imports itself and numeric libraries only.`,
      ),
      ban('^\\.\\./\\.\\.', `shared/${folder} imports nothing outside itself.`),
    ],
    ['shared/**/*.test.ts'],
  )

export const importRules = [
  pure('stats'),
  pure('allocation'),
  pure('acoustics'),
  block(
    ['shared/domain/**/*.ts'],
    [
      NODE,
      ban('^#(server|src|migrations|seeders|tests)/', 'shared/domain imports shared/ only.'),
      ban('^#shared/contracts/', 'domain does not know the contracts.'),
    ],
    ['shared/**/*.test.ts'],
  ),
  block(
    ['shared/contracts/**/*.ts'],
    [NODE, ban(outside('#shared/', 'zod'), 'contracts import shared/domain and zod only.')],
    ['shared/**/*.test.ts'],
  ),
  block(
    ['server/**/*.ts'],
    [
      ban('^#src/', 'server and src never import each other, not even types.'),
      ban('^(\\.\\./)+src/', 'server and src never import each other, not even types.'),
    ],
    ['server/**/*.test.ts', 'server/features/**', 'server/policies/**', 'server/models/**'],
  ),
  block(
    ['server/models/**/*.ts'],
    [ban('^#(src|server/features|server/http|server/policies)/', 'models hold columns only.')],
  ),
  block(
    ['server/policies/**/*.ts'],
    [ban('^(?!#shared/|\\./)', 'policies are pure: plain facts in, a boolean out.')],
    ['server/**/*.test.ts'],
  ),
  ...['routes', 'service', 'presenter'].map((layer) =>
    block(
      [`server/features/*/**/*${layer}.ts`],
      [
        ban('^#src/', 'server and src never import each other, not even types.'),
        ban(
          '^#server/features/(?!key/)[^/]+/(?!.*service\\.ts$).*',
          'a feature may call another feature’s service, nothing else of it.',
        ),
        ...(layer === 'routes'
          ? [
              ban(
                '^#server/(models|db|jobs|mail|uploads)/',
                'routes → service, presenter, policies, contracts, http.',
              ),
            ]
          : []),
        ...(layer === 'presenter'
          ? [ban('^#server/', 'a presenter turns plain rows into a contract’s type: no server code.')]
          : []),
      ],
    ),
  ),
  {
    files: ['server/**/*.ts'],
    ignores: ['server/features/key/**', 'server/models/**', 'server/db/**', 'server/**/*.test.ts'],
    rules: {
      'no-restricted-syntax': [
        'error',
        {
          selector:
            'ImportDeclaration[source.value=/models\\u002f(key-entry|round-secret|key-letter)\\.ts$/]',
          message: 'The key is read by server/features/key alone (B1).',
        },
        {
          selector: "MemberExpression[object.name='process'][property.name='env']",
          message: 'server/env.ts is the only reader of process.env.',
        },
      ],
    },
  },
  { files: ['server/env.ts'], rules: { 'no-restricted-syntax': 'off' } },
  block(
    ['src/**/*.{ts,tsx}'],
    [
      ban('^#server/', 'server and src never import each other, not even types.'),
      ban('^(\\.\\./)+server/', 'server and src never import each other, not even types.'),
      NODE,
    ],
    ['src/**/*.test.{ts,tsx}', 'src/features/**', 'src/components/**', 'src/hooks/**', 'src/lib/**'],
  ),
  block(
    ['src/components/**/*.{ts,tsx}', 'src/hooks/**/*.{ts,tsx}', 'src/lib/**/*.{ts,tsx}'],
    [
      ban('^#server/', 'server and src never import each other.'),
      ban('^#src/(features|app)/', 'components, hooks and lib know no feature.'),
      NODE,
    ],
    ['src/**/*.test.{ts,tsx}'],
  ),
  {
    files: ['migrations/**/*.ts'],
    rules: {
      'no-restricted-imports': [
        'error',
        { patterns: [ban('^(#|\\.\\./)', 'migrations import nothing of ours.')] },
      ],
    },
  },
  {
    files: ['shared/**/*.ts'],
    ignores: ['shared/**/*.test.ts'],
    rules: {
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'randomness is an argument.' },
        { object: 'Date', property: 'now', message: 'time is an argument.' },
      ],
    },
  },
]
