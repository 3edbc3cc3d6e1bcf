import tailwindcss from '@tailwindcss/vite'
import react from '@vitejs/plugin-react'
import { defineConfig } from 'vite'

/**
 * The browser build goes to dist/client. The server is bundled by `vite build --ssr server/index.ts`
 * (see scripts/build.mjs), so that a start needs no TypeScript loader.
 */
export default defineConfig(({ isSsrBuild }) => ({
  plugins: isSsrBuild ? [] : [react(), tailwindcss()],
  build: isSsrBuild
    ? {
        outDir: 'dist/server',
        emptyOutDir: true,
        target: 'node20',
        minify: false,
        sourcemap: true,
        copyPublicDir: false,
      }
    : { outDir: 'dist/client', emptyOutDir: true, target: 'es2022', sourcemap: false },
  server: { host: '127.0.0.1', strictPort: false },
}))
