/** Whether the server has done everything it must do before it may answer. */
let ready: Promise<void> = Promise.reject(new Error('starting was never begun'))
ready.catch(() => undefined)

export function becomeReady(work: Promise<void>): void {
  ready = work
}

/** @throws whatever kept the server from starting */
export function whenReady(): Promise<void> {
  return ready
}
