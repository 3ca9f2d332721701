/**
 * A figure beside what it may be, `most` or `least`, in its own unit.
 * @param {string} name
 * @param {number} value
 * @param {{ most?: number, least?: number }} bounds one of the two
 */
export function verdict(name, value, { most, least }, unit = '', decimals = 0) {
  const met = Number.isFinite(value) && (most === undefined || value <= most) && (least === undefined || value >= least)
  const write = (number) => `${number.toFixed(decimals)}${unit && ` ${unit}`}`
  const target = most === undefined ? `≥ ${write(least)}` : `≤ ${write(most)}`
  return { name, value: write(value), target, met }
}

/** Verdicts as a table in plain text, each met or MISSED. */
export function table(verdicts) {
  const rows = [
    ['', 'measured', 'target', ''],
    ...verdicts.map((row) => [row.name, row.value, row.target, row.met ? 'met' : 'MISSED']),
  ]
  const widths = [0, 1, 2, 3].map((column) => Math.max(...rows.map((row) => row[column].length)))
  return rows
    .map((row) =>
      row
        .map((cell, i) => (i === 0 ? cell.padEnd(widths[i]) : cell.padStart(widths[i])))
        .join('  ')
        .trimEnd(),
    )
    .join('\n')
}
