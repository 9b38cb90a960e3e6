import { fileURLToPath } from 'node:url';
import mdx from '@mdx-js/rollup';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import rehypeKatex from 'rehype-katex';
import remarkFrontmatter from 'remark-frontmatter';
import remarkGfm from 'remark-gfm';
import remarkMath from 'remark-math';
import remarkMdxFrontmatter from 'remark-mdx-frontmatter';
import { defineConfig } from 'vite';

const path = (relative: string) => fileURLToPath(new URL(relative, import.meta.url));

// Formulas of lessons are rendered while building: no formula engine goes to the browser.
const lessons = mdx({
  providerImportSource: undefined,
  remarkPlugins: [remarkGfm, remarkFrontmatter, remarkMdxFrontmatter, remarkMath],
  rehypePlugins: [[rehypeKatex, { strict: 'error', throwOnError: true, output: 'htmlAndMathml' }]],
});

/** Programs of the server's side, each its own file under dist/server. */
const programs = {
  main: path('server/main.ts'),
  mailbox: path('server/fakes/mailbox/main.ts'),
};

/** What every page needs, in one file: many small ones compress worse, by 4 kB on the first visit to a lesson. */
const shell = new RegExp(
  [
    'node_modules/(react|react-dom|scheduler|react-router|@tanstack|nanostores|@nanostores)/',
    'src/(main|router|paths|pages/(frame|broken|not-found))[.]',
    'src/lib/(api|session|query-client|scroll-memory)[.]',
    'src/i18n/(i18n|words|shell)[.]',
    'src/ui/(button|loading|page|sheet|notice|chip|mark)[.]',
  ].join('|'),
);

export default defineConfig(({ isSsrBuild }) => ({
  plugins: [{ enforce: 'pre', ...lessons }, react({ include: /\.(tsx|mdx)$/ }), tailwindcss()],
  build: isSsrBuild
    ? {
        ssr: true,
        outDir: 'dist/server',
        target: 'node20',
        copyPublicDir: false,
        rollupOptions: { input: programs, output: { entryFileNames: '[name].js' } },
      }
    : {
        outDir: 'dist/client',
        target: 'es2022',
        assetsInlineLimit: 0,
        manifest: true,
        rolldownOptions: { output: { codeSplitting: { groups: [{ name: 'shell', test: shell }] } } },
      },
  server: {
    host: '127.0.0.1',
    strictPort: true,
    proxy: Object.fromEntries(
      ['/api', '/healthz', '/readyz'].map((prefix) => [prefix, process.env.API_URL ?? 'http://127.0.0.1:4181']),
    ),
  },
}));
