/**
 * Who may import whom (see DEVELOPERS.md). One table, read from above: the first line whose `files` matches is
 * the one that counts, so that no rule can cancel another. tests/repo proves that each line bites.
 *
 * `may` lists what a file may import, as patterns over the target's path in the project ("shared/stats/mean.ts",
 * whether it was written "#shared/stats/mean.ts" or "../mean.ts") or over a package's name ("zod", "node:fs").
 * `:own` stands for the folder of the feature that the file belongs to.
 */
import { posix, relative, sep } from 'node:path'

const numeric = /^(simple-statistics|jstat|ml-matrix|ml-pca|@noble\/hashes)(\/|$)/
const packages = /^(?!node:|(shared|server|src|migrations|seeders|tests|scripts)\/)/
const node = /^node:/
const anyServerFile = /^server\//
const services = /^server\/features\/[^/]+\/([^/]+\/)*([^/]*-)?service\.ts$/

const pure = (folder) => ({
  files: new RegExp(`^shared/${folder}/`),
  may: [new RegExp(`^shared/${folder}/`), numeric],
  why: `shared/${folder} imports itself and the numeric libraries only`,
})

export const layers = [
  pure('stats'),
  pure('allocation'),
  pure('acoustics'),
  {
    files: /^shared\/domain\//,
    may: [/^shared\/(domain|stats|allocation|acoustics)\//, numeric],
    why: 'shared/domain imports itself and the pure folders beside it',
  },
  {
    files: /^shared\/contracts\//,
    may: [/^shared\/(contracts|domain)\//, /^zod$/],
    why: 'contracts import the domain and zod only',
  },
  {
    files: /^server\/models\//,
    may: [/^server\/models\//, /^shared\//, /^sequelize$/],
    why: 'models hold columns only',
  },
  {
    files: /^server\/policies\//,
    may: [/^server\/policies\//, /^shared\//],
    why: 'policies are pure: plain facts in, a boolean out',
  },
  {
    files: /^server\/features\/(?<own>[^/]+)\/(.+[/-])?presenter\.ts$/,
    may: [/^server\/features\/:own\/[^/]*presenter\.ts$/, /^shared\//],
    why: 'a presenter turns plain rows into a contract’s type: no server code',
  },
  {
    files: /^server\/features\/(?<own>[^/]+)\/(.+[/-])?routes\.ts$/,
    may: [
      /^server\/features\/:own\//,
      services,
      /^server\/(policies|http|auth)\//,
      /^shared\//,
      packages,
      node,
    ],
    mayNot: [/^(sequelize|pg|nodemailer|sharp)$/],
    why: 'routes know service, presenter, policies, contracts and http',
  },
  {
    files: /^server\/features\/(?<own>[^/]+)\//,
    may: [
      /^server\/features\/:own\//,
      services,
      /^server\/(?!features\/|app\.ts|index\.ts)/,
      /^shared\//,
      packages,
      node,
    ],
    mayNot: [/^(express|passport|.*routes\.ts)$/],
    why: 'a feature calls another feature’s service, nothing else of it, and knows no request',
  },
  {
    files: /^server\/(http|auth|db|mail|uploads)\//,
    may: [
      /^server\/(?!features\/|app\.ts|index\.ts)/,
      /^migrations\/index\.ts$/,
      /^shared\//,
      packages,
      node,
    ],
    why: 'what carries the features does not know them; server and src never import each other',
  },
  {
    files: anyServerFile,
    may: [anyServerFile, /^(shared|migrations|seeders)\//, packages, node],
    why: 'server and src never import each other, not even types',
  },
  {
    files: /^migrations\//,
    may: [/^migrations\//, packages, node],
    why: 'migrations import nothing of ours: they must mean the same in years',
  },
  {
    files: /^seeders\//,
    may: [/^(seeders|server|shared)\//, packages, node],
    why: 'seeders know the server and shared code',
  },
  {
    files: /^src\/(components|hooks|lib)\//,
    may: [/^src\/(components|hooks|lib|styles)\//, /^shared\//, packages],
    why: 'components, hooks and lib know no feature; server and src never import each other',
  },
  {
    files: /^src\/features\/(?<own>[^/]+)\//,
    may: [
      /^src\/features\/:own\//,
      /^src\/(components|hooks|lib|styles)\//,
      /^src\/app\/(paths\.ts|RoundSelvedge\.tsx)$/,
      /^shared\//,
      packages,
    ],
    why: 'a feature knows components, hooks and lib, and no other feature; server and src never import each other',
  },
  {
    files: /^src\//,
    may: [/^(src|shared)\//, packages],
    why: 'server and src never import each other, not even types',
  },
  {
    files: /^shared\//,
    may: [/^shared\//, numeric, /^zod$/],
    why: 'shared runs anywhere',
  },
]

/** The target of an import as a path in the project, or the package's name. */
function target(specifier, file) {
  if (specifier.startsWith('.')) return posix.normalize(posix.join(posix.dirname(file), specifier))
  return specifier.startsWith('#') ? specifier.slice(1) : specifier
}

function allows(pattern, own, path) {
  const filled = pattern.source.includes(':own') ? new RegExp(pattern.source.replace(':own', own)) : pattern
  return filled.test(path)
}

const imports = {
  meta: { type: 'problem', schema: [] },
  create(context) {
    const file = relative(context.cwd, context.filename).split(sep).join('/')
    const layer = layers.find(({ files }) => files.test(file))
    if (!layer) return {}
    const own = layer.files.exec(file)?.groups?.own ?? ''
    const check = (source) => {
      if (!source || typeof source.value !== 'string') return
      const path = target(source.value, file)
      const asset = /\.(css|svg|woff2?|png|json)(\?.*)?$/.test(path)
      const refused = layer.mayNot?.some((pattern) => allows(pattern, own, path))
      if (!refused && (asset || layer.may.some((pattern) => allows(pattern, own, path)))) return
      context.report({ node: source, message: `${layer.why}: not ${source.value}.` })
    }
    return {
      ImportDeclaration: (statement) => check(statement.source),
      ExportNamedDeclaration: (statement) => check(statement.source),
      ExportAllDeclaration: (statement) => check(statement.source),
      ImportExpression: (expression) => check(expression.source),
      TSImportType: (type) => check(type.source ?? type.argument?.literal),
    }
  },
}

const keyTables = 'key_entries|key_letters|key_listeners|round_secrets'
const keyModels = 'KeyEntry|KeyLetter|KeyListener|RoundSecret'
const keyMessage = 'The key is read by server/features/key alone (docs/blinding.md).'

const readsTheKey = [
  { selector: `Identifier[name=/^(${keyModels})$/]`, message: keyMessage },
  {
    selector: `Literal[value=/(${keyTables}|scrim_key|models\\u002f(key-|round-secret))/]`,
    message: keyMessage,
  },
  { selector: `TemplateElement[value.raw=/(${keyTables}|scrim_key)/]`, message: keyMessage },
]
const readsTheEnvironment = {
  selector: "MemberExpression[object.name='process'][property.name='env']",
  message: 'server/env.ts is the only reader of process.env.',
}
const asksTheTime = [
  { selector: 'NewExpression[callee.name="Date"][arguments.length=0]', message: 'Time is an argument.' },
  { selector: 'CallExpression[callee.name="Date"]', message: 'Time is an argument.' },
]
const tests = ['**/*.test.ts', '**/*.test.tsx']

export const importRules = [
  {
    files: ['shared/**/*.ts', 'server/**/*.ts', 'src/**/*.{ts,tsx}', 'migrations/**/*.ts', 'seeders/**/*.ts'],
    ignores: [...tests, '**/*.fixture.ts'],
    plugins: { house: { rules: { imports } } },
    rules: { 'house/imports': 'error' },
  },
  {
    files: ['server/**/*.ts'],
    ignores: [...tests, 'server/env.ts', 'server/features/key/**', 'server/models/**'],
    rules: { 'no-restricted-syntax': ['error', ...readsTheKey, readsTheEnvironment] },
  },
  {
    files: ['server/features/key/**/*.ts', 'server/models/**/*.ts'],
    rules: { 'no-restricted-syntax': ['error', readsTheEnvironment] },
  },
  {
    files: ['shared/**/*.ts'],
    ignores: tests,
    rules: {
      'no-restricted-syntax': ['error', ...asksTheTime],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'Randomness is an argument.' },
        { object: 'Date', property: 'now', message: 'Time is an argument.' },
      ],
    },
  },
  {
    files: ['shared/{stats,allocation,acoustics}/**/*.ts'],
    ignores: tests,
    rules: {
      'no-restricted-globals': [
        'error',
        'Date',
        'process',
        'crypto',
        'fetch',
        'window',
        'document',
        'performance',
      ],
    },
  },
]
