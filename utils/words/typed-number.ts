/** First digit of the decimal digits of scripts that phone keyboards type: Arabic, Persian, Devanagari, Bengali. */
const ZEROS = [0x0660, 0x06F0, 0x0966, 0x09E6]

function plainDigits(text: string): string {
  return text.replace(/\p{Nd}/gu, (digit) => {
    const code = digit.codePointAt(0) ?? 0
    const zero = ZEROS.find(start => code >= start && code < start + 10)
    return zero === undefined ? digit : String(code - zero)
  })
}

/**
 * What a person meant by a typed number: with comma or point, with any minus
 * sign, in any of the digits above. Null when nothing was typed, "unreadable"
 * when it is no number. Grouped thousands are not guessed at: nobody types
 * them into a reading, and "1,234" as 1.234 is caught by the field's range.
 */
export function readTypedNumber(typed: string): number | null | 'unreadable' {
  const text = plainDigits(typed.normalize('NFKC')).replace(/[\s\u200E\u200F\u061C]/g, '').replace(/[\u2212\u2013]/g, '-').replace(/[,\u066B]/g, '.')
  if (text === '') return null
  if (!/^[+-]?(\d+\.?\d*|\.\d+)$/.test(text)) return 'unreadable'
  return Number(text)
}

/** A stored number as a person would type it again: the reader's own decimal mark, no grouping. */
export function asTyped(value: number | null, decimals = 0, locale?: string): string {
  if (value === null) return ''
  return new Intl.NumberFormat(locale, { useGrouping: false, minimumFractionDigits: decimals, maximumFractionDigits: 6, numberingSystem: 'latn' }).format(value)
}

/** One press of a stepper. Works in whole steps, so that 6.1 + 0.1 is 6.2 and not 6.199999. */
export function stepped(value: number | null, direction: 1 | -1, rule: { step: number, start: number, min: number, max: number }): number {
  if (value === null) return Math.min(rule.max, Math.max(rule.min, rule.start))
  const steps = direction > 0
    ? Math.floor(value / rule.step + 1e-9) + 1
    : Math.ceil(value / rule.step - 1e-9) - 1
  const decimals = (String(rule.step).split('.')[1] ?? '').length
  return Math.min(rule.max, Math.max(rule.min, Number((steps * rule.step).toFixed(decimals))))
}
