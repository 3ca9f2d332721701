import { parseConfig } from './config'

/** Ends the process, naming each variable that is missing or wrong, before it answers anybody. */
export function requireConfig(): void {
  try {
    parseConfig(process.env)
  } catch (error) {
    console.error((error as Error).message)
    process.exit(1)
  }
}
