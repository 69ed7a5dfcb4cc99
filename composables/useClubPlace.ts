import { useClubStore } from '~/stores/club'
import { ROLE_WORDS } from '~/utils/words/names'
import { counted } from '~/utils/words/numbers'

/** A person's place in a club: "7 members · you are a mentor". */
export function useClubPlace() {
  const club = useClubStore()

  function placeWords(clubId: string): string {
    const role = club.myRole(clubId)
    const members = counted(club.membersOf(clubId).length, 'member')
    return role ? `${members} · you are a ${ROLE_WORDS[role].toLowerCase()}` : members
  }

  return { placeWords }
}
