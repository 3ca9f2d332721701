import { Agent, request } from 'node:http'

/**
 * Asks one address as fast as it answers, over connections that are kept: what one server does with nothing but
 * requests. No compression is asked for, so that pages of the same bytes cost the same to send.
 * @returns answers a second, and how many were not 200 or broke off
 */
export async function load(url, { seconds, connections = 20 }) {
  const agent = new Agent({ keepAlive: true, maxSockets: connections, maxFreeSockets: connections })
  const began = performance.now()
  const until = began + 1000 * seconds
  const counts = { answers: 0, failures: 0 }
  const one = async () => {
    while (performance.now() < until) {
      if ((await answered(url, agent)) === 200) counts.answers++
      else counts.failures++
    }
  }
  await Promise.all(Array.from({ length: connections }, one))
  const taken = (performance.now() - began) / 1000
  agent.destroy()
  return { perSecond: counts.answers / taken, failures: counts.failures }
}

/** The status of one answer, read to its end; 0 where it broke off. */
function answered(url, agent) {
  return new Promise((resolve) => {
    const asked = request(url, { agent }, (answer) => {
      answer.on('end', () => resolve(answer.statusCode))
      answer.on('error', () => resolve(0))
      answer.resume()
    })
    asked.on('error', () => resolve(0))
    asked.end()
  })
}
