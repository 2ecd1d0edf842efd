import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';
import { VitePWA } from 'vite-plugin-pwa';

const API = `http://localhost:${process.env.PORT ?? 4173}`;

export default defineConfig({
  plugins: [
    react(),
    tailwindcss(),
    VitePWA({
      // Nothing swaps under an open page: the reader is told of a new version and chooses.
      registerType: 'prompt',
      injectRegister: false,
      manifest: {
        id: '/',
        name: 'Steelyard',
        short_name: 'Steelyard',
        description: 'Weigh what a health intervention costs against what it gains, offline.',
        lang: 'en',
        start_url: '/',
        scope: '/',
        display: 'standalone',
        theme_color: '#FCFBF8',
        background_color: '#FCFBF8',
        icons: [
          { src: '/icons/icon-192.png', sizes: '192x192', type: 'image/png' },
          { src: '/icons/icon-512.png', sizes: '512x512', type: 'image/png' },
          {
            src: '/icons/maskable-512.png',
            sizes: '512x512',
            type: 'image/png',
            purpose: 'maskable',
          },
        ],
      },
      workbox: {
        globPatterns: ['**/*.{html,js,css,woff2,svg,png,json,wasm}'],
        maximumFileSizeToCacheInBytes: 2_000_000,
        cleanupOutdatedCaches: true,
        navigateFallback: '/index.html',
        navigateFallbackDenylist: [/^\/api\//, /^\/schema\//],
        // The service worker holds no copy of a runtime kept elsewhere.
        inlineWorkboxRuntime: true,
        sourcemap: false,
      },
    }),
  ],
  worker: { format: 'es' },
  build: {
    target: 'es2022',
    // Data URLs would need a wider Content-Security-Policy for fonts and images.
    assetsInlineLimit: 0,
    manifest: true,
    reportCompressedSize: false,
  },
  server: { proxy: { '/api': API } },
});
