/** A record id and an invitation token that nobody has. */
const NOBODY = '01970000-0000-7000-8000-00000000ffff'
const TOKEN = 'A'.repeat(43)

export type ListedRoute = {
  /** Under `server/api`. */
  file: string
  /** An address of it, for the questions that every route is asked alike. */
  path: string
  auth: 'account' | 'public'
  body?: unknown
  /** The file under `tests/integration` that asks it everything else. */
  tests: string
}

/** Every route. A route that is missing here, or whose tests do not call it, fails the run. */
export const routes: ListedRoute[] = [
  { file: 'health.get.ts', path: '/api/health', auth: 'public', tests: 'auth.test.ts' },
  { file: 'auth/me.get.ts', path: '/api/auth/me', auth: 'public', tests: 'auth.test.ts' },
  { file: 'auth/sign-up.post.ts', path: '/api/auth/sign-up', auth: 'public', body: {}, tests: 'auth.test.ts' },
  { file: 'auth/sign-in.post.ts', path: '/api/auth/sign-in', auth: 'public', body: {}, tests: 'auth.test.ts' },
  { file: 'auth/sign-out.post.ts', path: '/api/auth/sign-out', auth: 'public', tests: 'auth.test.ts' },
  { file: 'sync/push.post.ts', path: '/api/sync/push', auth: 'account', body: { ops: [{}] }, tests: 'sync-push.test.ts' },
  { file: 'sync/pull.get.ts', path: `/api/sync/pull?scope=user:${NOBODY}&since=0&limit=1`, auth: 'account', tests: 'sync-pull.test.ts' },
  { file: 'clubs/index.post.ts', path: '/api/clubs', auth: 'account', body: { name: 'Nobody’s' }, tests: 'clubs.test.ts' },
  {
    file: 'clubs/[id]/invitations/index.post.ts', path: `/api/clubs/${NOBODY}/invitations`, auth: 'account',
    body: { role: 'grower', usesLeft: 1 }, tests: 'invitations.test.ts',
  },
  { file: 'clubs/[id]/invitations/index.get.ts', path: `/api/clubs/${NOBODY}/invitations`, auth: 'account', tests: 'invitations.test.ts' },
  {
    file: 'clubs/[id]/invitations/[invitationId].delete.ts', path: `/api/clubs/${NOBODY}/invitations/${NOBODY}`, auth: 'account',
    tests: 'invitations.test.ts',
  },
  {
    file: 'clubs/[id]/members/[accountId].patch.ts', path: `/api/clubs/${NOBODY}/members/${NOBODY}`, auth: 'account',
    body: { role: 'mentor' }, tests: 'club-members.test.ts',
  },
  { file: 'clubs/[id]/members/[accountId].delete.ts', path: `/api/clubs/${NOBODY}/members/${NOBODY}`, auth: 'account', tests: 'club-members.test.ts' },
  { file: 'invitations/[token]/index.get.ts', path: `/api/invitations/${TOKEN}`, auth: 'public', tests: 'invitations.test.ts' },
  { file: 'invitations/[token]/accept.post.ts', path: `/api/invitations/${TOKEN}/accept`, auth: 'account', tests: 'invitations.test.ts' },
  { file: 'photos/[id]/content.put.ts', path: `/api/photos/${NOBODY}/content`, auth: 'account', tests: 'photo-upload.test.ts' },
  { file: 'photos/[id]/[width].get.ts', path: `/api/photos/${NOBODY}/640`, auth: 'account', tests: 'photo-upload.test.ts' },
]

/** The method is the last word of the file's name before its ending. */
export function methodOf({ file }: ListedRoute): string {
  return /\.(\w+)\.ts$/.exec(file)?.[1]?.toUpperCase() ?? ''
}
