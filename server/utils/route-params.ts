import * as z from 'zod/mini'
import { idSchema } from '#shared/domain/primitives'

/** The changing parts of addresses. One that does not fit is answered as "not found". */
export const clubParams = z.strictObject({ id: idSchema })
export const clubMemberParams = z.strictObject({ id: idSchema, accountId: idSchema })
export const clubInvitationParams = z.strictObject({ id: idSchema, invitationId: idSchema })
/** 32 random bytes as base64url. */
export const invitationTokenParams = z.strictObject({ token: z.string().check(z.regex(/^[\w-]{43}$/)) })
