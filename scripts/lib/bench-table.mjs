/** @typedef {{ label: string, value: number, unit: string }} Row */

/** @param {number[]} values at least one */
export function median(values) {
  const sorted = [...values].sort((a, b) => a - b)
  const middle = sorted.length / 2
  const upper = sorted[Math.floor(middle)] ?? Number.NaN
  const lower = sorted[Math.ceil(middle) - 1] ?? Number.NaN
  return (lower + upper) / 2
}

/** @param {number} value */
function readable(value) {
  return Math.abs(value) >= 100 ? value.toFixed(0) : value.toPrecision(3)
}

/**
 * @param {Row[]} rows
 * @returns {string[]}
 */
export function tableLines(rows) {
  const width = Math.max(...rows.map(row => row.label.length))
  const numbers = rows.map(row => readable(row.value))
  const numberWidth = Math.max(...numbers.map(text => text.length))
  const unitWidth = Math.max(...rows.map(row => row.unit.length))
  return rows.map((row, index) => {
    const first = rows.find(other => other.unit === row.unit)
    const ratio = first && first !== row && first.value !== 0 ? `× ${readable(row.value / first.value)}` : ''
    return `  ${row.label.padEnd(width)}  ${numbers[index]?.padStart(numberWidth)} ${row.unit.padEnd(unitWidth)}  ${ratio}`.trimEnd()
  })
}
