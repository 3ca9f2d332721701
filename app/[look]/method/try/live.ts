/** What the worked example needs once one types: loaded then, and not before. */
export { workOut } from '@/lib/workings/workings'
export { parseExample } from './example'
export { ShortView } from './short-view'
export { WorkingsView } from './workings-view'
