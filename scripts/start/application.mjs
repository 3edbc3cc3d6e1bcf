import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { startVite } from './dev.mjs'
import { freePort, lanAddress } from './ports.mjs'
import { spawnTracked } from './processes.mjs'

/**
 * Where the application will be: the port asked for or the next free one, and the address to hand out.
 * @param {{ lan: boolean, port: number }} options
 * @param {NodeJS.ProcessEnv} env SCRIM_ADDRESS is kept when somebody has set it (TLS in front)
 * @param {(line: string) => void} say
 */
export async function chooseAddress({ lan, port: wanted }, env, say) {
  const host = lan ? '0.0.0.0' : '127.0.0.1'
  const port = await freePort(host, wanted)
  if (port !== wanted) say(`Port ${wanted} is taken: using ${port}`)
  const name = lan ? (lanAddress() ?? '127.0.0.1') : '127.0.0.1'
  return { host, port, address: env.SCRIM_ADDRESS || `http://${name}:${port}` }
}

/**
 * Starts the server: the built one, or with `dev` the sources behind Vite.
 * @param {{ root: string, dev: boolean, host: string, port: number, env: NodeJS.ProcessEnv }} options
 */
export async function startApplication({ root, dev, host, port, env }) {
  const stay = pathToFileURL(join(root, 'scripts', 'start', 'leave-with-parent.mjs')).href
  const launch = (args, more) =>
    spawnTracked(process.execPath, args, {
      cwd: root,
      env: { ...env, ...more },
      stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
    })
  if (!dev) {
    const more = { NODE_ENV: 'production', HOST: host, PORT: String(port) }
    const args = ['--enable-source-maps', `--import=${stay}`, join('dist', 'server', 'index.js')]
    return { server: launch(args, more), close: async () => {} }
  }
  const serverPort = await freePort('127.0.0.1', port + 1)
  const vite = await startVite({ root, host, port, serverPort })
  const more = { NODE_ENV: 'development', HOST: '127.0.0.1', PORT: String(serverPort) }
  const tsx = join(root, 'node_modules', 'tsx', 'dist', 'cli.mjs')
  const args = [`--import=${stay}`, tsx, 'watch', '--clear-screen=false', 'server/index.ts']
  return { server: launch(args, more), close: () => vite.close() }
}
