/** Something outside us did not answer in time. Pages say so kindly; handlers answer 503. */
export class DeadlineExceeded extends Error {
  override name = 'DeadlineExceeded'
}

/** The promise's own outcome, or DeadlineExceeded with the message after so many milliseconds. */
export async function withDeadline<T>(promise: Promise<T>, milliseconds: number, message: string): Promise<T> {
  let timer: NodeJS.Timeout | undefined
  const deadline = new Promise<never>((_, reject) => {
    timer = setTimeout(() => reject(new DeadlineExceeded(`${message} within ${milliseconds} ms`)), milliseconds)
  })
  try {
    return await Promise.race([promise, deadline])
  } finally {
    clearTimeout(timer)
  }
}
