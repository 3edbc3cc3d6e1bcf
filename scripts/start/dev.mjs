import { join } from 'node:path'

/**
 * Vite's dev server for the browser's part, in this process; what is not a page goes on to the server.
 * @param {{ root: string, host: string, port: number, serverPort: number }} options
 * @returns {Promise<{ close: () => Promise<void> }>}
 */
export async function startVite({ root, host, port, serverPort }) {
  const { createServer } = await import('vite')
  const target = `http://127.0.0.1:${serverPort}`
  const vite = await createServer({
    root,
    configFile: join(root, 'vite.config.ts'),
    logLevel: 'warn',
    clearScreen: false,
    server: {
      host,
      port,
      strictPort: true,
      // Host stays as the browser sent it: the same-origin check compares it with Origin.
      proxy: { '^/api(/|$)': { target, changeOrigin: false } },
    },
  })
  await vite.listen()
  return vite
}
