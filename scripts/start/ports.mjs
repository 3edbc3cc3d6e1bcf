import { connect, createServer } from 'node:net'
import { networkInterfaces } from 'node:os'
import { pause } from './processes.mjs'

/**
 * A port that can be listened on now.
 * @param {string} host
 * @param {number} wanted tried first, then the nineteen after it; 0 = any
 * @returns {Promise<number>}
 */
export async function freePort(host, wanted = 0) {
  if (wanted > 0) {
    for (let port = wanted; port < Math.min(wanted + 20, 65_536); port += 1) {
      if (await tryListen(host, port)) return port
    }
  }
  const port = await tryListen(host, 0)
  if (!port) throw new Error(`No port is free on ${host}.`)
  return port
}

/** @returns {Promise<number | undefined>} the port, or nothing when it is taken or not allowed */
function tryListen(host, port) {
  return new Promise((resolve) => {
    const server = createServer()
    server.once('error', () => resolve(undefined))
    server.listen({ host, port, exclusive: true }, () => {
      const { port: taken } = /** @type {import('node:net').AddressInfo} */ (server.address())
      server.close(() => resolve(taken))
    })
  })
}

/**
 * Waits until something answers on the port.
 * @param {number} port
 * @param {() => boolean} goOn asked before each attempt
 */
export async function waitForPort(port, goOn = () => true) {
  while (goOn()) {
    const open = await new Promise((resolve) => {
      const socket = connect({ host: '127.0.0.1', port })
      socket.once('connect', () => resolve(true)).once('error', () => resolve(false))
      socket.once('connect', () => socket.destroy())
    })
    if (open) return true
    await pause(100)
  }
  return false
}

/** This machine's first address on the local network, private ranges first; undefined without a network. */
export function lanAddress() {
  const found = Object.values(networkInterfaces())
    .flat()
    .filter((one) => one && one.family === 'IPv4' && !one.internal && !one.address.startsWith('169.254.'))
    .map((one) => one.address)
  return found.find((address) => /^(192\.168|10|172\.(1[6-9]|2\d|3[01]))\./.test(address)) ?? found[0]
}
