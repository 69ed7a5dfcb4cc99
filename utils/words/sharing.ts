import { counted } from './numbers'

/** Who will see what, said before it happens. `before` is the club that sees it now. */
export function sharingWords(club: { name: string, members: number } | null, before: string | null): string {
  if (!club) {
    const now = 'Only you see this plant, its entries and its photos. No steward can open it.'
    return before === null ? now : `${now} ${before} stops seeing it as soon as this is sent; what somebody has written down or copied stays with them.`
  }
  const who = club.members === 1 ? `All who belong to ${club.name}` : `All ${counted(club.members, 'member')} of ${club.name}`
  return `${who}, and whoever joins later, see the plant, its place and vessel, and every entry and photo from day 0 on. They can comment; only you can change it. Your other plants stay private.`
}
