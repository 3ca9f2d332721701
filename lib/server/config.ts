import 'server-only'
import { parseConfig } from '@/lib/config'

/** The site's configuration, read once; a wrong or missing variable stops the process with its name. */
export const config = parseConfig(process.env)
