import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const VENDORS = [
  { name: 'grid', test: /node_modules[\\/]ag-(grid|stack|charts)/ },
  { name: 'charts', test: /node_modules[\\/](echarts|zrender)/ },
  { name: 'controls', test: /node_modules[\\/](antd|@ant-design|@rc-component)/ },
  { name: 'react', test: /node_modules[\\/](react|react-dom|react-router|react-router-dom|scheduler)[\\/]/ },
];

export default defineConfig({
  plugins: [react()],
  server: { host: '127.0.0.1', proxy: { '/api': 'http://127.0.0.1:3000' } },
  build: {
    outDir: 'dist',
    chunkSizeWarningLimit: 1200,
    rolldownOptions: { output: { codeSplitting: { groups: VENDORS } } },
  },
  test: {
    environment: 'jsdom',
    include: ['src/**/*.test.{ts,tsx}'],
    setupFiles: ['src/test/setup.ts'],
    testTimeout: 60_000,
  },
});
