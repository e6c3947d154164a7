import { fileURLToPath } from 'node:url'
import vue from '@vitejs/plugin-vue'
import { defineConfig } from 'vite'

/** Builds the client. In development the API runs behind the same address (`BOTHWAYS_API`, set by scripts/start.js). */
export default defineConfig({
  plugins: [vue()],
  root: fileURLToPath(new URL('.', import.meta.url)),
  build: {
    outDir: 'dist',
    assetsInlineLimit: 0,
    chunkSizeWarningLimit: 700,
  },
  worker: { format: 'es' },
  optimizeDeps: { include: ['element-plus/es', 'element-plus/es/components/*/style/css'] },
  server: {
    strictPort: true,
    proxy: Object.fromEntries(
      ['/api', '/mail', '/livez', '/readyz'].map((path) => [path, { target: process.env['BOTHWAYS_API'] ?? '' }]),
    ),
  },
})
