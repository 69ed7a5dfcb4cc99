import { computed, onScopeDispose, ref } from 'vue'
import type { Ref } from 'vue'
import { PHOTO_SUBJECTS, PHOTOS_PER_ENTRY_MAX } from '#shared/domain/photo.schema'
import type { PhotoSubject } from '#shared/domain/photo.schema'
import type { ChosenPhoto } from '~/stores/entries'
import type { PickedPhoto } from '~/types/ui'
import type { LogForm } from '~/utils/log/log-form'
import { PhotoProblem } from '~/utils/photos/photo-problem'
import { preparePhoto } from '~/utils/photos/prepare-photo'
import { useDraftPhotoBytes } from './useDraftPhotoBytes'

const UNKNOWN_PROBLEM = 'This photo could not be prepared. What you wrote is safe. Pick it again, or save without it.'

/**
 * Photos of a visit that is not saved yet: prepared one by one while the rest
 * of the form goes on, and kept with the draft.
 *
 * @param alreadyThere photos the entry has before this form was opened
 */
export function useDraftPhotos(draftId: string, form: Ref<LogForm>, alreadyThere: () => number = () => 0) {
  const picked = ref<PickedPhoto[]>([])
  const kept = useDraftPhotoBytes(draftId)
  /** Photos of the draft whose bytes did not survive. */
  const lost = ref(0)
  const jobs = new Set<Promise<void>>()
  const room = computed(() => PHOTOS_PER_ENTRY_MAX - alreadyThere() - picked.value.filter(photo => photo.state !== 'failed').length)

  function add(files: File[]): void {
    for (const file of files.slice(0, Math.max(0, room.value))) {
      const photo: PickedPhoto = { key: crypto.randomUUID(), src: null, subject: nextSubject(), state: 'preparing' }
      picked.value.push(photo)
      const job = prepare(photo.key, file).finally(() => jobs.delete(job))
      jobs.add(job)
    }
  }

  /** The subject that this visit has no photo of yet. */
  function nextSubject(): PhotoSubject {
    const taken = new Set(picked.value.map(photo => photo.subject))
    return PHOTO_SUBJECTS.find(subject => !taken.has(subject)) ?? 'whole'
  }

  const find = (key: string) => picked.value.find(photo => photo.key === key)

  async function prepare(key: string, file: File): Promise<void> {
    try {
      const { bytes, ...details } = await preparePhoto(file)
      const photo = find(key)
      if (!photo) return
      await kept.keep(key, bytes)
      form.value.photos.push({ key, subject: photo.subject, ...details })
      photo.src = show(bytes)
      photo.state = 'ready'
    } catch (error) {
      const photo = find(key)
      if (!photo) return
      photo.state = 'failed'
      photo.message = error instanceof PhotoProblem ? error.message : UNKNOWN_PROBLEM
    }
  }

  function show(bytes: ArrayBuffer): string {
    return URL.createObjectURL(new Blob([bytes], { type: 'image/jpeg' }))
  }

  function setSubject(key: string, subject: PhotoSubject): void {
    for (const photo of [find(key), form.value.photos.find(one => one.key === key)]) if (photo) photo.subject = subject
  }

  async function remove(key: string): Promise<void> {
    const src = find(key)?.src
    if (src) URL.revokeObjectURL(src)
    picked.value = picked.value.filter(photo => photo.key !== key)
    form.value.photos = form.value.photos.filter(photo => photo.key !== key)
    await kept.forget([key])
  }

  /** Takes up the photos of a restored draft. */
  async function restore(): Promise<void> {
    const there = await kept.restore(form.value.photos.map(photo => photo.key))
    lost.value = form.value.photos.length - there.size
    form.value.photos = form.value.photos.filter(photo => there.has(photo.key))
    picked.value = form.value.photos.map(({ key, subject }) => {
      const bytes = there.get(key)
      return { key, subject, state: 'ready', src: bytes ? show(bytes) : null }
    })
  }

  /** The photos to save, once the last one is prepared. */
  async function chosen(): Promise<ChosenPhoto[]> {
    await Promise.all(jobs)
    return form.value.photos.flatMap(({ key, subject, ...details }) => {
      const bytes = kept.bytesOf(key)
      return bytes ? [{ subject, prepared: { ...details, bytes } }] : []
    })
  }

  onScopeDispose(() => picked.value.forEach(photo => photo.src && URL.revokeObjectURL(photo.src)))
  return { picked, room, lost, unkept: kept.unkept, add, remove, setSubject, restore, chosen, forgetAll: kept.forgetAll }
}
