import { problem } from '@/lib/contract/problem'
import { answering } from '../../answering'

export const dynamic = 'force-dynamic'

/** Every other address under the API fails in the API's own shape rather than as a page. */
const absent = answering(async () => problem(404, 'There is nothing at this address'))

export { absent as DELETE, absent as GET, absent as PATCH, absent as POST, absent as PUT }
