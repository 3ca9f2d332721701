/** A price in minor units as people write it: £189, £189.50, €249. Whole amounts carry no decimals. */
export function formatMoney({ amount, currency }: { amount: number; currency: string }): string {
  const format = new Intl.NumberFormat('en-GB', { style: 'currency', currency, trailingZeroDisplay: 'stripIfInteger' })
  const digits = format.resolvedOptions().maximumFractionDigits ?? 2
  return format.format(amount / 10 ** digits)
}
