import 'server-only'
import { type Config, parseConfig } from '@/lib/config'

let known: Config | undefined

/**
 * The site's configuration, read when it is first asked for: a build loads the pages too, and needs none of it. A web
 * process has been refused at its start where a variable is missing (lib/boot.ts).
 */
export function config(): Config {
  known ??= parseConfig(process.env)
  return known
}
