import tailwindcss from '@tailwindcss/vite'
import react from '@vitejs/plugin-react'
import { defineConfig } from 'vite'

const server = `http://127.0.0.1:${process.env['PORT'] ?? '4173'}`

export default defineConfig({
  plugins: [react(), tailwindcss()],
  server: { proxy: { '/api': server, '/schema': server } },
  build: {
    outDir: 'dist',
    // Browsers that know light-dark() and MathML, so that neither is rewritten.
    target: ['chrome123', 'firefox120', 'safari17.5'],
    // Fonts and pictures stay files: the content policy allows no data: fonts.
    assetsInlineLimit: 0,
    modulePreload: { polyfill: false },
    chunkSizeWarningLimit: 700,
  },
})
