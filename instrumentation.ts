/** Runs once when a web process starts: a wrong configuration stops it before the first request. */
export async function register() {
  if (process.env.NEXT_RUNTIME === 'nodejs') {
    const { requireConfig } = await import('@/lib/boot')
    requireConfig()
    const { keepOnePolicy } = await import('@/lib/one-policy')
    keepOnePolicy()
  }
}
