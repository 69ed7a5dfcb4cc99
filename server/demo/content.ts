import { ADA, BENNO, MARISOL, ODETTE, TOBIAS, WREN } from './people'
import { balconyPepper } from './plants/balcony-pepper'
import { bottleBasil } from './plants/bottle-basil'
import { cornerPepper } from './plants/corner-pepper'
import { doorBasil } from './plants/door-basil'
import { dwarfTomato } from './plants/dwarf-tomato'
import { secondLettuce } from './plants/second-lettuce'
import { sixLettuces } from './plants/six-lettuces'
import { stairAubergine } from './plants/stair-aubergine'
import type { DemoClub } from './types'

/** A club that does not exist, on a roof nobody will find. The main story comes first. */
export const demoClub: DemoClub = {
  name: 'Swallow Terrace Growers',
  members: [
    { email: MARISOL, role: 'grower' },
    { email: TOBIAS, role: 'grower' },
    { email: WREN, role: 'grower' },
    { email: ADA, role: 'grower' },
    { email: ODETTE, role: 'mentor' },
    { email: BENNO, role: 'steward' },
  ],
  plants: [
    dwarfTomato, doorBasil, balconyPepper, sixLettuces, bottleBasil, stairAubergine, cornerPepper, secondLettuce,
  ],
}
