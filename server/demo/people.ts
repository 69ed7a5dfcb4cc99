/** The e-mails of accounts.json, by name. */
export const MARISOL = 'marisol@terrace.example'
export const TOBIAS = 'tobias@terrace.example'
export const WREN = 'wren@terrace.example'
export const ADA = 'ada@terrace.example'
export const ODETTE = 'odette@terrace.example'
export const BENNO = 'benno@terrace.example'

export const TIME_ZONE = 'Europe/Lisbon'
