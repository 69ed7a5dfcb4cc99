import { Op as Where } from 'sequelize'
import type { ClubRole } from '#shared/domain/club.schema'
import { Club } from '../database/models/Club'
import { Membership } from '../database/models/Membership'
import { Plant } from '../database/models/Plant'
import type { StoredRecord } from '../services/sync/ports'
import { toRecord } from './record-codec'

/** The one membership that an account has or once had in a club. */
export async function findMembershipId(clubId: string, accountId: string): Promise<string | null> {
  const membership = await Membership.findOne({ attributes: ['id'], where: { clubId, accountId } })
  return membership?.id ?? null
}

export async function countMembers(clubId: string, role: ClubRole): Promise<number> {
  return Membership.count({ where: { clubId, role, deletedAt: null } })
}

/** The club of this name in which the account has this role. */
export async function findClubIdByName(accountId: string, role: ClubRole, name: string): Promise<string | null> {
  const memberships = await Membership.findAll({ attributes: ['clubId'], where: { accountId, role, deletedAt: null } })
  const club = await Club.findOne({
    attributes: ['id'],
    where: { id: { [Where.in]: memberships.map(membership => membership.clubId) }, name, deletedAt: null },
  })
  return club?.id ?? null
}

/** Plants of one owner that a club may see, deleted ones included. */
export async function findPlantsSharedBy(ownerId: string, clubId: string): Promise<StoredRecord[]> {
  const rows = await Plant.findAll({ where: { ownerId, clubId, visibility: 'club' }, raw: true })
  return rows.map(row => toRecord('plant', { ...row }))
}
