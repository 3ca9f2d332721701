/** Runs once when a web process starts: a wrong configuration stops it before the first request. */
export async function register() {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { parseConfig } = await import('@/lib/config')
  try {
    parseConfig(process.env)
  } catch (error) {
    console.error((error as Error).message)
    process.exit(1)
  }
}
