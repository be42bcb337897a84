import { sveltekit } from '@sveltejs/kit/vite';
import { defineConfig } from 'vitest/config';
import { childSource } from './src/bin/child-source.ts';

export default defineConfig({
	plugins: [childSource(), sveltekit()],
	server: { fs: { allow: ['lessons'] } },
	// Captions must stay files: small ones would become data: addresses, which the CSP refuses.
	build: { assetsInlineLimit: (path) => (path.endsWith('.vtt') ? false : undefined) },
	test: {
		include: ['tests/**/*.test.ts'],
		exclude: ['tests/e2e/**'],
		benchmark: { include: ['tests/bench/**/*.bench.ts'] },
		setupFiles: ['tests/support/setup.ts'],
		environment: 'node',
		pool: 'forks',
		retry: 0,
		testTimeout: 20_000,
		hookTimeout: 60_000
	}
});
