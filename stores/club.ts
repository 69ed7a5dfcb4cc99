import { defineStore } from 'pinia'
import { computed } from 'vue'
import * as z from 'zod/mini'
import { CLUB_ROLES } from '#shared/domain/club.schema'
import type { ClubRole, InvitationRequest, Membership } from '#shared/domain/club.schema'
import type { View } from '~/types/view'
import { request } from '~/utils/offline/account-api'
import { useJournalStore } from './journal'
import { useSyncStore } from './sync'

const invitationSchema = z.object({ id: z.string(), role: z.enum(CLUB_ROLES), usesLeft: z.int(), expiresAt: z.string() })
const placeSchema = z.object({ club: z.object({ id: z.string() }) })
const previewSchema = z.object({ clubName: z.string(), role: z.enum(CLUB_ROLES) })

/** The clubs this person belongs to. Reading works without signal; making and managing ask the server. */
export const useClubStore = defineStore('club', () => {
  const journal = useJournalStore()
  const sync = useSyncStore()

  const memberships = computed(() => [...journal.shelves.membership.values()])
  const mine = computed(() => memberships.value.filter(membership => membership.data.accountId === journal.phone?.accountId))
  const clubs = computed(() => mine.value.flatMap(membership => journal.shelves.club.get(membership.data.clubId) ?? []))

  const nameOf = (clubId: string | null): string | null => (clubId ? journal.shelves.club.get(clubId)?.data.name ?? null : null)
  const membersOf = (clubId: string): View<Membership>[] => memberships.value
    .filter(membership => membership.data.clubId === clubId)
    .sort((left, right) => left.data.displayName.localeCompare(right.data.displayName))
  const myRole = (clubId: string): ClubRole | null => mine.value.find(membership => membership.data.clubId === clubId)?.data.role ?? null
  /** A person as the clubs know them; null when no club shows them any more. */
  const person = (accountId: string): Membership | null => (
    memberships.value.find(membership => membership.data.accountId === accountId)?.data ?? null
  )

  async function afterwards<T>(answer: Promise<T>): Promise<T> {
    const result = await answer
    sync.kick()
    return result
  }
  const path = (clubId: string, rest = ''): string => `/api/clubs/${clubId}${rest}`

  return {
    clubs,
    nameOf,
    membersOf,
    myRole,
    person,
    create: (name: string) => afterwards(request('POST', '/api/clubs', placeSchema, { name })),
    invitations: (clubId: string) => request('GET', path(clubId, '/invitations'), z.object({ invitations: z.array(invitationSchema) })),
    invite: (clubId: string, form: InvitationRequest) => request(
      'POST', path(clubId, '/invitations'), z.object({ invitation: invitationSchema, token: z.string() }), form,
    ),
    withdraw: (clubId: string, invitationId: string) => request('DELETE', path(clubId, `/invitations/${invitationId}`), z.unknown()),
    preview: (token: string) => request('GET', `/api/invitations/${encodeURIComponent(token)}`, previewSchema),
    accept: (token: string) => afterwards(request('POST', `/api/invitations/${encodeURIComponent(token)}/accept`, placeSchema, {})),
    changeRole: (clubId: string, accountId: string, role: ClubRole) => afterwards(
      request('PATCH', path(clubId, `/members/${accountId}`), z.unknown(), { role }),
    ),
    removeMember: (clubId: string, accountId: string) => afterwards(request('DELETE', path(clubId, `/members/${accountId}`), z.unknown())),
  }
})
