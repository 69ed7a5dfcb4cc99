/**
 * Writes a fault of ours to the log: its kind, its number and where it happened.
 * A database's error carries the statement with everything the person wrote;
 * that stays out of the log.
 */
export function reportFault(about: string, error: unknown): void {
  process.stderr.write(`[stillroot] ${about}: ${describeFault(error)}\n`)
}

export function describeFault(error: unknown): string {
  if (!(error instanceof Error)) return typeof error
  const frames = (error.stack ?? '').split('\n').filter(line => line.startsWith('    at '))
  return [titleOf(error), ...frames].join('\n')
}

function titleOf(error: Error): string {
  const original: unknown = Reflect.get(error, 'original')
  if (original instanceof Error) return `${error.name} ${String(Reflect.get(original, 'code'))} (${String(Reflect.get(original, 'errno'))})`
  return 'sql' in error ? error.name : `${error.name}: ${error.message}`
}
