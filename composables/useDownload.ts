/** Hands data to the person as a file of their own. */
export function useDownload() {
  function saveFile(name: string, blob: Blob): void {
    const address = URL.createObjectURL(blob)
    const link = document.createElement('a')
    link.href = address
    link.download = name
    link.click()
    // The browser reads the address after the click has returned.
    setTimeout(() => URL.revokeObjectURL(address), 60_000)
  }

  function saveJson(name: string, value: unknown): void {
    saveFile(`${name}.json`, new Blob([JSON.stringify(value, null, 2)], { type: 'application/json' }))
  }

  return { saveFile, saveJson }
}
