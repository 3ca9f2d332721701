import { pageMetadata } from '@/lib/server/page-metadata'
import { methodData } from './data'
import { MethodView } from './method-view'

export const dynamic = 'force-static'
export const revalidate = 60

export const generateMetadata = () =>
  pageMetadata({
    title: 'Method 1',
    description:
      'How Lampleaf turns spectrophotometer readings and your answers into a ranking: every formula, constant and source, a worked example you can change, the uncertainty budget and the control charts.',
    path: '/method',
  })

export default async function MethodPage() {
  return <MethodView data={await methodData()} />
}
