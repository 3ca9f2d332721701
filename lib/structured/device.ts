import { CREATOR } from '@/lib/dataset/about'
import { figureList } from '@/lib/findings/figure-list'
import type { Figure, PublishedFigures } from '@/lib/findings/published'
import { formatDay } from '@/lib/format/date'
import { formatDoubt, formatNumber } from '@/lib/format/number'
import type { EditionDevice } from '@/lib/method/types'

/** Where and how every page is measured: Method 1, section 1. */
const TECHNIQUE =
  'Sphere spectrophotometer, d/8°, specular included, illuminant D65, CIE 1964 10° observer, front light off'

export type DeviceFacts = {
  device: EditionDevice
  figures: PublishedFigures
  edition: { number: number; publishedOn: string }
  /** The editor's own words; null where none are written. */
  note: string | null
  /** A price seen in a shop, and the day; null where there is none or the device is not sold. */
  price: { amount: number; currency: string; seenOn: string; seller: string } | null
}

/**
 * schema.org data of a device's page: the product with each figure and its doubt, and our review of it in words. There
 * is no rating in it: the guide gives none.
 * @param siteUrl makes an absolute address of a path
 */
export function deviceStructuredData(
  { device, figures, edition, note, price }: DeviceFacts,
  siteUrl: (path: string) => string,
): object {
  const url = siteUrl(`/devices/${device.slug}`)
  const guide = { '@type': 'Organization', name: CREATOR, url: siteUrl('/') }
  return {
    '@context': 'https://schema.org',
    '@graph': [
      {
        '@type': 'Product',
        '@id': `${url}#device`,
        name: device.name,
        url,
        brand: { '@type': 'Brand', name: device.maker },
        category: 'Electronic-paper reading device',
        additionalProperty: propertiesOf(figures, siteUrl),
        review: { '@id': `${url}#review` },
        ...(price && { offers: offerOf(price) }),
      },
      {
        '@type': 'Review',
        '@id': `${url}#review`,
        url,
        itemReviewed: { '@id': `${url}#device` },
        author: guide,
        publisher: guide,
        datePublished: edition.publishedOn,
        inLanguage: 'en-GB',
        reviewBody: note ?? plainSentence(device, figures, edition.number),
        isBasedOn: siteUrl(`/editions/${edition.number}`),
      },
    ],
  }
}

/** What stands in for an editor's note where none is written. */
export function plainSentence(device: EditionDevice, { lightness, contrast }: PublishedFigures, edition: number) {
  return `${device.name}, edition ${edition}: L* ${words(lightness, 1)} on the page, contrast ${words(contrast, 1)} to 1.`
}

function words({ value, doubt }: Figure, decimals: number): string {
  return `${formatNumber(value, decimals)} ${formatDoubt(doubt, decimals)}`
}

/** Every published figure. What lies outside its formula's limits says so wherever it goes. */
function propertiesOf(figures: PublishedFigures, siteUrl: (path: string) => string) {
  return figureList(figures).map(({ method, name, figure, unit, decimals, outside }) => ({
    '@type': 'PropertyValue',
    name,
    value: rounded(figure.value, decimals),
    minValue: rounded(figure.value - figure.doubt, decimals + 1),
    maxValue: rounded(figure.value + figure.doubt, decimals + 1),
    unitText: unit,
    measurementTechnique: TECHNIQUE,
    description: `${formatDoubt(figure.doubt, decimals)} at about 95 % (k = 2)${outside ? '; outside the stated limits of the formula' : ''}`,
    url: siteUrl(`/method#q-${method}`),
  }))
}

function rounded(value: number, decimals: number): number {
  return Number(value.toFixed(decimals))
}

/** A price as we saw it: somebody else's offer, with its day, never converted. */
function offerOf({ amount, currency, seenOn, seller }: NonNullable<DeviceFacts['price']>) {
  const digits =
    new Intl.NumberFormat('en', { style: 'currency', currency }).resolvedOptions().maximumFractionDigits ?? 2
  const price = (amount / 10 ** digits).toFixed(digits)
  return {
    '@type': 'Offer',
    price,
    priceCurrency: currency,
    description: `Seen on ${formatDay(seenOn)} at ${seller}`,
    priceSpecification: { '@type': 'UnitPriceSpecification', price, priceCurrency: currency, validFrom: seenOn },
  }
}
