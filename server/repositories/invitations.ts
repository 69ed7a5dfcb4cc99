import { Op as Where } from 'sequelize'
import type { ClubRole } from '#shared/domain/club.schema'
import { Invitation } from '../database/models/Invitation'

export type InvitationRow = {
  id: string
  clubId: string
  tokenSha256: string
  role: ClubRole
  usesLeft: number
  expiresAt: Date
  createdBy: string
  revokedAt: Date | null
}

export async function insertInvitation(row: InvitationRow): Promise<void> {
  await Invitation.create({ ...row })
}

export async function findInvitationByToken(tokenSha256: string): Promise<InvitationRow | null> {
  const invitation = await Invitation.findOne({ where: { tokenSha256 }, raw: true })
  return invitation ? { ...invitation } : null
}

/** A club's invitations that still work, the newest first. */
export async function findGoodInvitations(clubId: string, now: Date): Promise<InvitationRow[]> {
  const rows = await Invitation.findAll({
    where: { clubId, revokedAt: null, usesLeft: { [Where.gt]: 0 }, expiresAt: { [Where.gt]: now } },
    order: [['expiresAt', 'DESC'], ['id', 'DESC']],
    raw: true,
  })
  return rows.map(row => ({ ...row }))
}

/** Takes one use off. Call while the club's feed is held. */
export async function takeInvitationUse(id: string): Promise<void> {
  await Invitation.decrement('usesLeft', { where: { id } })
}

/** Ends an invitation of this club; false when the club has none with this id. */
export async function revokeInvitation(clubId: string, id: string, at: Date): Promise<boolean> {
  if (await Invitation.count({ where: { id, clubId } }) === 0) return false
  await Invitation.update({ revokedAt: at }, { where: { id, clubId, revokedAt: null } })
  return true
}
