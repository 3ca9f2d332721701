import { existsSync } from 'node:fs'
import { run } from './processes.mjs'
import { Trouble } from './steps.mjs'

export const isRoot = process.getuid?.() === 0

/**
 * Installs a Debian package where a file of it is missing: as root, or through sudo.
 * Without either, names the one line an administrator must run.
 * @returns 'present' or 'installed'
 */
export async function ensureDebianPackage(name, file, sudo = '/usr/bin/sudo') {
  if (existsSync(file)) return 'present'
  if (!existsSync('/usr/bin/apt-get')) {
    throw new Trouble(`${file} is missing, and this is not Debian. Install ${name} and run the command again.`)
  }
  const line = `apt-get update && apt-get install -y --no-install-recommends ${name}`
  const env = { DEBIAN_FRONTEND: 'noninteractive' }
  if (isRoot) await run('sh', ['-c', line], { env })
  else if (await needsNoPassword(sudo))
    await run(sudo, ['-n', 'sh', '-c', `DEBIAN_FRONTEND=noninteractive; export DEBIAN_FRONTEND; ${line}`])
  else if (process.stdin.isTTY && existsSync(sudo)) await run(sudo, ['sh', '-c', line], { show: true })
  else
    throw new Trouble(
      `${name} is not installed, and this user may not install it. An administrator must run:\n  ${line}`,
    )
  if (!existsSync(file)) throw new Trouble(`${name} was installed, but ${file} is still missing. Is this Debian 12?`)
  return 'installed'
}

async function needsNoPassword(sudo) {
  if (!existsSync(sudo)) return false
  return run(sudo, ['-n', 'true']).then(
    () => true,
    () => false,
  )
}
