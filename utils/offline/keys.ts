import type { RecordType } from '#shared/sync/protocol'

/** Where things stand in the phone's store. Keys sort in the order in which they are read. */
export const keys = {
  device: 'device',
  epoch: 'epoch',
  base: (type: RecordType, id: string) => `base/${type}/${id}`,
  outbox: (deviceSeq: number, opId: string) => `outbox/${String(deviceSeq).padStart(12, '0')}/${opId}`,
  attention: (opId: string) => `attention/${opId}`,
  acked: (opId: string) => `acked/${opId}`,
  cursor: (scope: string) => `cursor/${scope}`,
  /** Bytes of a photo taken on this phone. */
  bytes: (sha256: string) => `bytes/${sha256}`,
  /** A photo whose bytes wait to be sent. */
  upload: (photoId: string) => `upload/${photoId}`,
  /** A smaller copy of somebody's photo, kept to be seen without signal. */
  picture: (photoId: string) => `picture/${photoId}`,
  /** Whose copies are kept, the longest kept first. */
  keptPictures: 'kept-pictures',
  draft: (plantId: string) => `draft/${plantId}`,
  /** Bytes of a photo that waits in a draft, apart from it so that a letter typed does not write a photo again. */
  draftPhoto: (draftId: string, photoKey: string) => `draft-photo/${draftId}/${photoKey}`,
}

export const prefixes = {
  base: 'base/',
  baseOf: (type: RecordType) => `base/${type}/`,
  outbox: 'outbox/',
  attention: 'attention/',
  acked: 'acked/',
  cursor: 'cursor/',
  upload: 'upload/',
  picture: 'picture/',
  draftPhotosOf: (draftId: string) => `draft-photo/${draftId}/`,
}
