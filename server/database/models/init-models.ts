import type { Sequelize } from 'sequelize'
import { initAccount } from './Account'
import { initAccountSession } from './AccountSession'
import { initClub } from './Club'
import { initComment } from './Comment'
import { initConflict } from './Conflict'
import { initEntry } from './Entry'
import { initInvitation } from './Invitation'
import { initMembership } from './Membership'
import { initNotice } from './Notice'
import { initPhoto } from './Photo'
import { initPlant } from './Plant'
import { initVessel } from './Vessel'

const initialisers = [
  initAccount,
  initAccountSession,
  initClub,
  initComment,
  initConflict,
  initEntry,
  initInvitation,
  initMembership,
  initNotice,
  initPhoto,
  initPlant,
  initVessel,
]

/** Binds every model to the open database. */
export function initModels(sequelize: Sequelize): void {
  for (const init of initialisers) init(sequelize)
}
