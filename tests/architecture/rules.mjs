// Who may import whom: one table for ESLint and for the architecture test.
const computing = ['load', 'rode', 'seabed', 'stats', 'trial', 'holding', 'ranking']
const row = ['shared/load', 'shared/rode', 'shared/seabed', 'shared/units', 'shared/utils', 'shared/types']
const impure = ['vue', 'h3', 'nitropack', 'drizzle-orm', 'pg', 'node:*', 'fs', 'path', 'crypto', 'zod', 'zod/mini', 'mathjs', 'ml-matrix']
const butFor = (...kept) => impure.filter(name => !kept.some(keep => name.startsWith(keep)))

/** `may`: the only folders of ours it may import; `never`: folders of ours it may not; `packages`: npm packages it may not. */
export const importRules = [
  { of: 'shared/units', may: ['shared/units'], packages: impure, remedy: 'units know no domain: pass the number in, or move the code to the folder of its domain word' },
  { of: 'shared/stats', may: ['shared/stats'], packages: butFor('ml-matrix'), remedy: 'statistics know no domain: take arrays, let shared/holding name things' },
  ...['load', 'rode', 'seabed'].map(name => ({
    of: `shared/${name}`, may: [`shared/${name}`, 'shared/units', 'shared/utils', 'shared/types'], packages: impure,
    remedy: 'load, rode and seabed stand alone: join them in shared/ranking',
  })),
  { of: 'shared/trial', may: ['shared/trial', 'shared/stats', ...row], packages: impure, remedy: 'trial -> holding -> ranking: move it to the right' },
  { of: 'shared/holding', may: ['shared/holding', 'shared/trial', 'shared/stats', ...row], packages: impure, remedy: 'trial -> holding -> ranking: move it to the right' },
  { of: 'shared/ranking', may: ['shared/ranking', 'shared/holding', 'shared/trial', 'shared/stats', ...row], packages: impure, remedy: 'ranking computes from what it is handed' },
  ...['access', 'billing', 'schemas'].map(name => ({
    of: `shared/${name}`, may: [`shared/${name}`, 'shared/types', 'shared/units', 'shared/utils'], packages: name === 'schemas' ? butFor('zod') : impure,
    remedy: 'no computing here: a service calls the computation',
  })),
  ...['types', 'utils'].map(name => ({ of: `shared/${name}`, may: ['shared/types', 'shared/utils'], packages: impure, remedy: 'types and small helpers import nothing else' })),
  { of: 'server/db/queries', may: ['server/db', 'shared/types'], packages: ['h3', 'stripe'], remedy: 'a query takes a database or a transaction and hands back rows' },
  { of: 'server/services', never: ['server/api', 'server/middleware', 'app', 'seed', 'tests'], packages: ['drizzle-orm', 'h3'], remedy: 'SQL goes to server/db/queries, the event stays in the handler' },
  { of: 'server/api', never: ['server/db/schema', 'app', 'seed', 'tests', ...computing.map(name => `shared/${name}`)], packages: ['drizzle-orm', 'pg', 'stripe'], remedy: 'a handler validates, authorises, makes one call to a service and returns' },
  { of: 'server/integrations', never: ['server/db', 'server/services', 'app', 'seed', 'tests'], packages: ['drizzle-orm'], remedy: 'an adapter knows its own service only' },
  { of: 'server', never: ['app', 'seed', 'tests'], packages: [], remedy: 'the server stands without pages, demo world and tests' },
  ...['base', 'chart'].map(name => ({
    of: `app/components/${name}`, may: ['app/components/base', `app/components/${name}`, 'app/utils'], packages: [],
    remedy: 'no domain word here: pass numbers and words in as props',
  })),
  { of: 'app', never: ['server', 'seed', 'tests', 'drizzle'], packages: ['drizzle-orm', 'pg', 'pg-boss', 'stripe', 'mathjs', 'node:*'], remedy: 'pages ask the API; what both need stands in shared/' },
  { of: 'shared', never: ['app', 'server', 'seed', 'tests'], packages: [], remedy: 'shared is pure and stands alone' },
]

/** Globals that would make shared/ depend on where and when it runs. */
export const impureGlobals = ['process', 'fetch', 'console', 'window', 'document', 'navigator', 'localStorage', 'Buffer', 'setTimeout', 'setInterval']
export const impureProperties = [['Date', 'now'], ['Math', 'random'], ['performance', 'now']]

const forms = folder => [`#${folder}`, `#${folder}/**`, `~/${folder.replace(/^app\//, '')}/**`, `~~/${folder}/**`, `**/${folder}/**`]
const domains = ['load', 'rode', 'seabed', 'stats', 'trial', 'holding', 'ranking', 'access', 'billing', 'schemas', 'units', 'utils', 'types'].map(name => `shared/${name}`)
const whole = ['app', 'server', 'seed', 'tests', 'drizzle']

/** The folders that a rule forbids, whether it lists what it may or what it may never. */
export function forbiddenFolders(rule) {
  if (rule.never) return rule.never
  const kept = name => rule.may.some(may => may === name || may.startsWith(`${name}/`))
  return [...domains, ...whole].filter(name => !kept(name))
}

/** The same rules as ESLint configurations, one a folder. */
export const eslintRules = importRules.map(rule => ({
  files: [`${rule.of}/**/*.{ts,vue}`],
  rules: {
    'no-restricted-imports': ['error', {
      patterns: [{
        group: [...forbiddenFolders(rule).flatMap(forms), ...rule.packages.flatMap(name => [name, `${name}/**`])],
        message: rule.remedy,
      }],
    }],
  },
}))
