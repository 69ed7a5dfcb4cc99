import type { IncomingMessage } from 'node:http'
import { PHOTO_WIDTHS } from '#shared/domain/photo.schema'
import type { PhotoWidth } from '#shared/domain/photo.schema'
import type { RecordState } from '#shared/sync/protocol'
import { sharedClubOf } from '../policies/records'
import { presentRecord } from '../presenters/record'
import { notFound } from '../utils/errors'
import { findStoredPhoto, receivePhoto } from './photo-store'
import type { StoredPhoto } from './photo-store'
import type { StoredRecord, SyncDependencies } from './sync/ports'
import { scopesOfRecord } from './sync/scopes'
import { WorkUnit } from './sync/work-unit'

/**
 * Takes the bytes of a photo whose record is there. Only the plant's owner may
 * send them; bytes that came before are welcome again and change nothing.
 *
 * @throws ApiError not_found, and what `receivePhoto` says of bad uploads
 */
export async function acceptPhotoBytes(
  dependencies: SyncDependencies, accountId: string, photoId: string, request: IncomingMessage, uploadsDir: string,
): Promise<RecordState> {
  const { photo } = await ownPhoto(dependencies, accountId, photoId)
  const stored = await receivePhoto(request, uploadsDir, String(photo.data.sha256))
  return noteStored(dependencies, accountId, photoId, stored)
}

/** Writes down that the bytes of a photo are on disk, and tells everybody who may see it. */
export async function noteStored(
  dependencies: SyncDependencies, accountId: string, photoId: string, stored: StoredPhoto,
): Promise<RecordState> {
  return dependencies.repository.transaction(async () => {
    const first = await ownPhoto(dependencies, accountId, photoId)
    await dependencies.repository.lockScopes(scopesOfRecord(first.photo, first.plant).sort())
    const { photo: current, plant } = await ownPhoto(dependencies, accountId, photoId)
    if (current.data.storedAt !== null) return presentRecord(current)
    const unit = WorkUnit.ofServer(dependencies, accountId)
    const next = await unit.update(current, 'patch', {
      storedAt: unit.at, placeholder: stored.placeholder, files: stored.widths,
    }, scopesOfRecord(current, plant))
    await unit.close()
    return presentRecord(next)
  })
}

/** The picture for somebody who may see its entry. @throws ApiError not_found */
export async function openPhoto(
  dependencies: SyncDependencies, accountId: string, photoId: string, width: number, uploadsDir: string,
) {
  const { repository } = dependencies
  const photo = await repository.find('photo', photoId)
  const plant = photo ? await repository.find('plant', String(photo.data.plantId)) : null
  if (!photo || !plant || photo.deleted || photo.data.storedAt === null) throw notFound()
  const club = sharedClubOf(plant)
  const visible = plant.data.ownerId === accountId || (club !== null && await repository.roleIn(club, accountId) !== null)
  const file = visible && isPhotoWidth(width) ? await findStoredPhoto(uploadsDir, String(photo.data.sha256), width) : null
  if (!file) throw notFound()
  return file
}

async function ownPhoto(
  { repository }: SyncDependencies, accountId: string, photoId: string,
): Promise<{ photo: StoredRecord, plant: StoredRecord }> {
  const photo = await repository.find('photo', photoId)
  const plant = photo ? await repository.find('plant', String(photo.data.plantId)) : null
  if (!photo || !plant || photo.deleted || plant.data.ownerId !== accountId) throw notFound()
  return { photo, plant }
}

function isPhotoWidth(width: number): width is PhotoWidth {
  return PHOTO_WIDTHS.some(known => known === width)
}
