import node from '@astrojs/node';
import react from '@astrojs/react';
import tailwindcss from '@tailwindcss/vite';
import { defineConfig } from 'astro/config';

export default defineConfig({
  output: 'server',
  adapter: node({ mode: 'standalone' }),
  integrations: [react()],
  devToolbar: { enabled: false },
  // Host, Origin and body size are checked by scripts/server.mjs for every request, JSON included.
  security: { checkOrigin: false },
  experimental: { csp: true },
  vite: {
    plugins: [tailwindcss()],
    ssr: { noExternal: ['zod'] },
  },
});
