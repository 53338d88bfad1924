import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

/** Large packages apart, so that only the pages that use them load them. Each takes along what the earlier ones leave of its imports. */
const VENDORS = [
  { name: 'react', test: /node_modules[\\/](react|react-dom|react-router|react-router-dom|scheduler)[\\/]/ },
  { name: 'grid', test: /node_modules[\\/]ag-(grid|stack|charts)/ },
  { name: 'charts', test: /node_modules[\\/](echarts|zrender)/ },
];

export default defineConfig({
  plugins: [react()],
  server: { host: '127.0.0.1', proxy: { '/api': 'http://127.0.0.1:3000' } },
  build: {
    outDir: 'dist',
    chunkSizeWarningLimit: 900,
    rolldownOptions: { output: { codeSplitting: { groups: VENDORS } } },
  },
  test: {
    environment: 'jsdom',
    include: ['src/**/*.test.{ts,tsx}'],
    setupFiles: ['src/test/setup.ts'],
    testTimeout: 60_000,
  },
});
