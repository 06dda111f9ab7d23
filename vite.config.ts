import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';

const root = import.meta.dirname;

/** server/main.ts and each worker become files of their own in dist/server, so that `new Worker` finds them there. */
function serverEntries(): Record<string, string> {
  const workers = join(root, 'server/workers');
  const names = existsSync(workers) ? readdirSync(workers).filter((name) => name.endsWith('.ts')) : [];
  return {
    main: join(root, 'server/main.ts'),
    ...Object.fromEntries(names.map((name) => [`workers/${name.slice(0, -3)}`, join(workers, name)])),
  };
}

// `vite build` makes the client, `vite build --ssr` the server; packages stay outside the server's bundle.
export default defineConfig(({ isSsrBuild }) => ({
  root,
  plugins: isSsrBuild ? [] : [react(), tailwindcss()],
  build: isSsrBuild
    ? {
        outDir: 'dist/server',
        target: 'node20',
        copyPublicDir: false,
        sourcemap: true,
        rolldownOptions: { input: serverEntries(), output: { entryFileNames: '[name].js' } },
      }
    : { outDir: 'dist/client', emptyOutDir: true, assetsInlineLimit: 0, sourcemap: false },
}));
