/** A record as screens get it: what the server knows with this phone's unsent changes laid on top. */
export type View<T> = {
  id: string
  /** Version of the record that the person was shown; 0 when the server has never had it. */
  ver: number
  data: T
  /** True while a change of it waits to be sent. */
  unsent: boolean
  /** True when the server refused a change of it and somebody has to look. */
  attention: boolean
}

/** A photo chosen and re-encoded on this phone, ready to be saved with an entry. */
export type PreparedPhoto = {
  bytes: ArrayBuffer
  sha256: string
  widthPx: number
  heightPx: number
  takenAt: string | null
}

/** What became of a save on this phone. `issues` carry the field's path. */
export type SaveOutcome =
  | { ok: true, id: string }
  | { ok: false, message: string, issues: { path: string, message: string }[] }
