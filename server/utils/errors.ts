import type { FieldIssue } from '#shared/sync/protocol'

type ErrorDetails = {
  status: number
  /** Stable word that programs decide on. */
  code: string
  /** What happened, what is safe and what to do, for the person in front of the screen. */
  message: string
  issues?: FieldIssue[]
  retryAfterSeconds?: number
}

/** A failure with an answer. Everything else that is thrown is a fault of ours and is logged. */
export class ApiError extends Error {
  readonly status: number
  readonly code: string
  readonly issues?: FieldIssue[]
  readonly retryAfterSeconds?: number

  constructor(details: ErrorDetails) {
    super(details.message)
    this.name = 'ApiError'
    this.status = details.status
    this.code = details.code
    this.issues = details.issues
    this.retryAfterSeconds = details.retryAfterSeconds
  }
}

export function unreadableRequest(): ApiError {
  return new ApiError({ status: 400, code: 'unreadable', message: 'The request could not be read. Nothing was changed. Reload the page and try again.' })
}

export function notSignedIn(): ApiError {
  return new ApiError({ status: 401, code: 'not_signed_in', message: 'You are signed out. What you saved on this phone is kept. Sign in to send it.' })
}

export function wrongCredentials(): ApiError {
  return new ApiError({ status: 401, code: 'wrong_credentials', message: 'E-mail and password do not match. Check both and try again.' })
}

export function crossSiteRequest(): ApiError {
  return new ApiError({ status: 403, code: 'cross_site', message: 'This request came from another site and was not carried out.' })
}

export function notAllowed(): ApiError {
  return new ApiError({ status: 403, code: 'not_allowed', message: 'Your role in this club does not allow that. Nothing was changed.' })
}

/** For what does not exist and for what is not theirs: nobody can tell which. */
export function notFound(): ApiError {
  return new ApiError({ status: 404, code: 'not_found', message: 'There is nothing here that you may see.' })
}

export function accountMismatch(): ApiError {
  return new ApiError({ status: 409, code: 'account_mismatch', message: 'This phone is signed in as somebody else. Nothing was sent.' })
}

export function emailTaken(): ApiError {
  return new ApiError({ status: 409, code: 'email_taken', message: 'There is an account with this e-mail address already. Sign in instead.', issues: [{ path: 'email', message: 'is in use' }] })
}

export function lastSteward(): ApiError {
  return new ApiError({ status: 409, code: 'last_steward', message: 'A club needs a steward. Make somebody else a steward first.' })
}

export function invitationSpent(): ApiError {
  return new ApiError({ status: 410, code: 'invitation_spent', message: 'This invitation is used up or has expired. Ask the club’s steward for a new one.' })
}

export function feedPruned(): ApiError {
  return new ApiError({ status: 410, code: 'feed_pruned', message: 'This phone has not asked for so long that it must read everything again.' })
}

export function tooLarge(): ApiError {
  return new ApiError({ status: 413, code: 'too_large', message: 'That is more than can be sent at once. Nothing was changed.' })
}

export function invalid(issues: FieldIssue[]): ApiError {
  return new ApiError({ status: 422, code: 'invalid', message: 'Something in the form needs another look. Nothing was lost.', issues })
}

export function unavailable(): ApiError {
  return new ApiError({ status: 503, code: 'unavailable', message: 'The server cannot reach its records just now. What you saved on this phone is kept and will be sent later.', retryAfterSeconds: 5 })
}
