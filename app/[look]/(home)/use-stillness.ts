import { useEffect, useState } from 'react'

/** True where nothing shall move: the paper theme, or a reader who asked for less motion (the token `--motion-ms` is 0). */
export function useStillness(): boolean {
  const [still, setStill] = useState(false)
  useEffect(() => {
    const milliseconds = getComputedStyle(document.documentElement).getPropertyValue('--motion-ms')
    setStill(Number(milliseconds) === 0)
  }, [])
  return still
}
