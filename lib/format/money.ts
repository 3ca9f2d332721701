// Making a format costs some hundred times what using it does, and a shortlist may name a price for every device.
const formats = new Map<string, Intl.NumberFormat>()

/** A price in minor units as people write it: £189, £189.50, €249. Whole amounts carry no decimals. */
export function formatMoney({ amount, currency }: { amount: number; currency: string }): string {
  let format = formats.get(currency)
  if (!format) {
    format = new Intl.NumberFormat('en-GB', { style: 'currency', currency, trailingZeroDisplay: 'stripIfInteger' })
    formats.set(currency, format)
  }
  const digits = format.resolvedOptions().maximumFractionDigits ?? 2
  return format.format(amount / 10 ** digits)
}
