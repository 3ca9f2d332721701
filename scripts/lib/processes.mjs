import { spawn } from 'node:child_process'
import { Trouble } from './steps.mjs'

/** Programs of ours that still run. */
const children = new Set()
const endings = []
let ending = null

/**
 * Runs a program to its end; its output is kept back and shown only where it fails.
 * @returns its standard output
 */
export function run(command, args, { env = {}, cwd, input, show = false } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, {
      cwd,
      env: { ...process.env, ...env },
      stdio: [input === undefined ? 'ignore' : 'pipe', show ? 'inherit' : 'pipe', show ? 'inherit' : 'pipe'],
    })
    children.add(child)
    let out = ''
    let all = ''
    child.stdout?.on('data', (chunk) => {
      out += chunk
      all += chunk
    })
    child.stderr?.on('data', (chunk) => {
      all += chunk
    })
    if (input !== undefined) child.stdin.end(input)
    child.on('error', (cause) => {
      children.delete(child)
      reject(new Trouble(`${command} could not be run: ${cause.message}`))
    })
    child.on('close', (code) => {
      children.delete(child)
      if (code === 0) return resolve(out)
      const failure = new Trouble(`${command} ${args.join(' ')} ended with ${code}.\n${all.trim()}`)
      failure.code = code
      failure.output = all
      reject(failure)
    })
  })
}

/** Starts a program that stays until we stop. `onExit` hears of an end that nobody asked for. */
export function keepRunning(command, args, { env = {}, log, onExit } = {}) {
  const child = spawn(command, args, { env: { ...process.env, ...env }, stdio: ['ignore', 'pipe', 'pipe'] })
  child.stdout.on('data', (chunk) => log?.(String(chunk)))
  child.stderr.on('data', (chunk) => log?.(String(chunk)))
  children.add(child)
  child.on('exit', (code, signal) => {
    children.delete(child)
    if (!ending) onExit?.(code ?? signal)
  })
  return child
}

/** Something to do when we stop, last registered first. */
export function atEnd(work) {
  endings.push(work)
}

/** Stops every program we started, then undoes the rest. Safe to call twice. */
export function stopEverything() {
  ending ??= (async () => {
    await Promise.all([...children].map(stop))
    for (const work of endings.reverse()) await work()
  })()
  return ending
}

function stop(child) {
  return new Promise((resolve) => {
    if (child.exitCode !== null || child.signalCode !== null) return resolve()
    const harder = setTimeout(() => child.kill('SIGKILL'), 8000)
    child.once('exit', () => {
      clearTimeout(harder)
      resolve()
    })
    child.kill('SIGTERM')
  })
}

/**
 * Ctrl-C, a closed terminal and a polite kill all end in stopEverything; so does the end of whoever started us, since
 * npm passes a kill to its shell, and the shell to nobody.
 */
export function stopOnSignals() {
  const parent = process.ppid
  const watch = setInterval(async () => {
    if (process.ppid === parent) return
    clearInterval(watch)
    await stopEverything()
    process.exit(143)
  }, 1000)
  watch.unref()
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(signal, async () => {
      await stopEverything()
      process.exit(signal === 'SIGINT' ? 130 : 143)
    })
  }
}
