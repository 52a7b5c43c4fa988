/// <reference types="vitest/config" />
import { builtinModules } from 'node:module';
import path from 'node:path';
import react from '@vitejs/plugin-react';
import { defineConfig, type EnvironmentOptions } from 'vite';

const at = (relative: string): string => path.resolve(import.meta.dirname, relative);

/** One file for Node or Electron, with everything but Electron and Node's own modules inside. */
const OWN_NAME =
  "import { fileURLToPath as ownPath } from 'node:url'; const __filename = ownPath(import.meta.url);";

function nodeFile(entry: string, out: string, format: 'cjs' | 'es'): EnvironmentOptions {
  return {
    consumer: 'server',
    resolve: { noExternal: true, conditions: ['node', 'module', 'import', 'default'] },
    build: {
      outDir: at(path.dirname(out)),
      emptyOutDir: false,
      target: 'node20',
      minify: false,
      sourcemap: true,
      copyPublicDir: false,
      rolldownOptions: {
        input: { [path.parse(out).name]: at(entry) },
        external: ['electron', ...builtinModules, /^node:/],
        output: {
          format,
          entryFileNames: path.basename(out),
          codeSplitting: false,
          // Packages written for the other format ask for their own file's name.
          ...(format === 'es' ? { banner: OWN_NAME } : {}),
        },
      },
    },
  };
}

export default defineConfig({
  root: at('renderer'),
  base: './',
  publicDir: at('renderer/public'),
  plugins: [react()],
  worker: { format: 'es' },
  build: { outDir: at('out/renderer'), emptyOutDir: true, target: 'chrome120', chunkSizeWarningLimit: 2000 },
  environments: {
    main: nodeFile('electron/main.ts', 'out/electron/main.cjs', 'cjs'),
    preload: nodeFile('electron/preload.ts', 'out/electron/preload.cjs', 'cjs'),
    command: nodeFile('electron/command/tautline.ts', 'out/command/tautline.mjs', 'es'),
  },
  builder: {
    async buildApp(builder) {
      for (const environment of Object.values(builder.environments))
        if (environment.name !== 'ssr') await builder.build(environment);
    },
  },
  server: { host: '127.0.0.1', port: 5173, strictPort: true, fs: { allow: [at('.')] } },
  test: {
    root: at('.'),
    projects: [
      {
        test: {
          name: 'unit',
          root: at('.'),
          include: ['tests/{unit,published,properties,architecture}/**/*.test.ts'],
          environment: 'node',
          testTimeout: 60_000,
        },
      },
      {
        test: {
          name: 'e2e',
          root: at('.'),
          include: ['tests/e2e/**/*.test.ts'],
          environment: 'node',
          testTimeout: 120_000,
          hookTimeout: 120_000,
          fileParallelism: false,
        },
      },
    ],
  },
});
