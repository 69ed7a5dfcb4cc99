import type { NoticeCode } from '#shared/domain/notice.schema'

type Told = { code: NoticeCode, plantId: string | null, entryId: string | null }

/** What happened, with the names that the reader knows. */
export function noticeWords(code: NoticeCode, who: string, plantName: string): string {
  switch (code) {
    case 'comment-added': return `${who} commented on ${plantName}`
    case 'both-kept': return `Two values were kept for ${plantName}. Choose the right one.`
    case 'delete-refused': return `Something of ${plantName} was not deleted: it had been changed or commented on meanwhile.`
    case 'restored-by-edit': return `Something of ${plantName} that was deleted is back: it was changed on another phone meanwhile.`
    case 'comment-on-deleted': return `${who} commented on a deleted entry of ${plantName}.`
  }
}

/** Where to see it; null when there is nothing left to see. */
export function noticeLink({ code, plantId, entryId }: Told): string | null {
  if (code === 'both-kept') return '/attention'
  if (!plantId) return null
  return entryId ? entryLink(plantId, entryId) : `/plants/${plantId}`
}

/** The place of an entry on its plant's page. */
export function entryLink(plantId: string, entryId: string): string {
  return `/plants/${plantId}#entry-${entryId}`
}
