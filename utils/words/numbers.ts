import type { Aim } from '~/types/ui'

/** A number in the reader's own form; never more decimals than asked for. */
export function number(value: number, decimals = 1, locale?: string): string {
  return new Intl.NumberFormat(locale, { maximumFractionDigits: decimals }).format(value)
}

/** A number with exactly so many decimals, for readings that stand below each other. */
export function fixed(value: number, decimals: number, locale?: string): string {
  return new Intl.NumberFormat(locale, { minimumFractionDigits: decimals, maximumFractionDigits: decimals }).format(value)
}

export function litres(value: number, locale?: string): string {
  return `${number(value, value < 20 ? 1 : 0, locale)} L`
}

export function aimWords(aim: Aim, locale?: string): string {
  return `aim ${number(aim.low, 2, locale)} to ${number(aim.high, 2, locale)}`
}

/** "1 plant", "3 plants". */
export function counted(count: number, one: string, many = `${one}s`, locale?: string): string {
  return `${number(count, 0, locale)} ${count === 1 ? one : many}`
}
