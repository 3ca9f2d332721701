/** The middle of some numbers, or the mean of the two in the middle. NaN where there are none. */
export function median(numbers) {
  const sorted = [...numbers].sort((one, other) => one - other)
  const middle = sorted.length / 2
  return sorted.length % 2 === 1 ? sorted[Math.floor(middle)] : (sorted[middle - 1] + sorted[middle]) / 2
}
