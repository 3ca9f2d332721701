/** Says what is being done and, when it is done, how long it took. Failure stops with one readable paragraph. */
export async function step(name, work) {
  const began = Date.now()
  process.stdout.write(`${name} … `)
  try {
    const note = await work()
    const seconds = ((Date.now() - began) / 1000).toFixed(1)
    process.stdout.write(`${typeof note === 'string' ? note : 'done'} (${seconds} s)\n`)
    return note
  } catch (error) {
    process.stdout.write('failed\n')
    throw error
  }
}

/** A failure a person can mend: the message says what is wrong and what to do; no stack is shown. */
export class Trouble extends Error {}

export function sayAndExit(error) {
  console.error(error instanceof Trouble ? `\n${error.message}\n` : error)
  process.exit(1)
}
