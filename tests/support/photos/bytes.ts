/** Small tools to write picture files byte by byte. They run in Node and in a browser. */
export function joinBytes(...parts: (Uint8Array | number[])[]): Uint8Array<ArrayBuffer> {
  const joined = new Uint8Array(parts.reduce((sum, part) => sum + part.length, 0))
  let at = 0
  for (const part of parts) {
    joined.set(part, at)
    at += part.length
  }
  return joined
}

export function ascii(text: string): Uint8Array {
  return Uint8Array.from(text, letter => letter.charCodeAt(0))
}

export function uint16(value: number): number[] {
  return [value >> 8 & 0xFF, value & 0xFF]
}

export function uint32(value: number): number[] {
  return [...uint16(Math.floor(value / 65_536)), ...uint16(value % 65_536)]
}

/** Whether a text stands anywhere in a file. */
export function containsText(bytes: Uint8Array, text: string): boolean {
  return new TextDecoder('latin1').decode(bytes).includes(text)
}
