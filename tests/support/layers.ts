import { posix } from 'node:path'

/**
 * The layers of the project and the one direction between them:
 * pages → components → stores and composables → utils/offline → network, and
 * server/api → services → repositories → database. `shared/` is for all of them.
 *
 * Four kinds of file stand beside the line on purpose. Plugins put a side
 * together, so they may import all of it. A `ports.ts` says what a layer needs
 * from the one below, so the one below may import it; it knows only `shared/`.
 * Services open transactions, so that one file of the database is theirs too.
 * The route constructor stands at the border for every route: it asks services
 * who is there, and tells a database that is away from a fault of ours.
 */
const layerOfPrefix = [
  ['shared/', 'shared'],
  ['app.vue', 'page'],
  ['error.vue', 'page'],
  ['pages/', 'page'],
  ['layouts/', 'page'],
  ['middleware/', 'app-middleware'],
  ['plugins/', 'app-plugin'],
  ['components/', 'component'],
  ['stores/', 'state'],
  ['composables/', 'state'],
  ['utils/offline/', 'offline'],
  ['utils/', 'app-util'],
  ['assets/', 'asset'],
  ['types/', 'type'],
  ['service-worker/', 'service-worker'],
  ['server/api/', 'api'],
  ['server/routes/', 'api'],
  ['server/middleware/', 'server-middleware'],
  ['server/plugins/', 'server-plugin'],
  ['server/services/', 'service'],
  ['server/policies/', 'policy'],
  ['server/presenters/', 'presenter'],
  ['server/repositories/', 'repository'],
  ['server/database/', 'database'],
  ['server/jobs/', 'job'],
  ['server/mail/', 'mail'],
  ['server/photos/', 'photo-work'],
  ['server/demo/', 'demo'],
  ['server/utils/define-route.ts', 'route-constructor'],
  ['server/utils/', 'server-util'],
  ['server/types/', 'server-type'],
  ['server/build/', 'tool'],
  ['scripts/', 'tool'],
  ['bench/', 'tool'],
  ['tests/', 'tool'],
] as const

export type Layer = (typeof layerOfPrefix)[number][1] | 'port' | 'transaction'

/** What each layer may import beside itself and `shared/`. */
const below: Record<Layer, readonly Layer[]> = {
  'shared': [],
  'page': ['component', 'state', 'app-util', 'asset', 'type'],
  'component': ['state', 'app-util', 'asset', 'type'],
  'state': ['offline', 'port', 'app-util', 'type'],
  'app-middleware': ['state', 'app-util', 'type'],
  'app-plugin': ['component', 'state', 'offline', 'port', 'app-util', 'asset', 'type'],
  'offline': ['port', 'app-util', 'type'],
  'app-util': ['asset', 'type'],
  'asset': [],
  'type': [],
  'service-worker': ['app-util', 'type'],
  'port': ['type'],
  'api': ['route-constructor', 'service', 'server-util'],
  'route-constructor': ['service', 'database', 'port', 'server-util'],
  'server-middleware': ['service', 'server-util'],
  'server-plugin': ['service', 'job', 'mail', 'repository', 'database', 'transaction', 'photo-work', 'demo', 'port', 'server-util'],
  'service': ['policy', 'presenter', 'repository', 'transaction', 'mail', 'photo-work', 'port', 'server-util'],
  'policy': ['port', 'server-util'],
  'presenter': ['port', 'server-util'],
  'repository': ['database', 'transaction', 'port', 'server-util'],
  'transaction': ['database', 'server-util'],
  'database': ['transaction', 'server-util'],
  'job': ['service', 'server-util'],
  'mail': ['port', 'server-util'],
  'photo-work': ['port', 'server-util'],
  'demo': ['service', 'repository', 'transaction', 'photo-work', 'port', 'server-util'],
  'server-util': ['port'],
  'server-type': ['port'],
  'tool': [],
}

/** The layer a file belongs to; null for one that no rule names. */
export function layerOf(path: string): Layer | null {
  if (path === 'server/database/transaction.ts') return 'transaction'
  if (/^(?:server|utils)\/.*\/(?:[\w-]+-)?ports\.ts$/.test(path)) return 'port'
  if (/^[\w.-]+\.config\.(?:ts|mjs|js)$/.test(path)) return 'tool'
  return layerOfPrefix.find(([prefix]) => path.startsWith(prefix))?.[1] ?? null
}

/** Whether a file of one layer may import a file of another. Tools may import anything, nothing may import a tool. */
export function mayImport(from: Layer, to: Layer): boolean {
  return from === 'tool' || from === to || to === 'shared' || below[from].includes(to)
}

/** The project file that an import means, from the root and without extension rules; null for a package. */
export function resolveImport(fromPath: string, specifier: string): string | null {
  const bare = specifier.replace(/\?.*$/, '')
  if (bare.startsWith('.')) return posix.join(posix.dirname(fromPath), bare)
  const alias = /^(?:~~?|@@?)\/(.*)$/.exec(bare)
  if (alias) return alias[1] ?? ''
  const named = /^#(shared|server)\/(.*)$/.exec(bare)
  return named ? `${named[1]}/${named[2]}` : null
}
