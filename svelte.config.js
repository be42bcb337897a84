import adapter from '@sveltejs/adapter-node';
import { vitePreprocess } from '@sveltejs/vite-plugin-svelte';
import { mdsvex } from 'mdsvex';
import mdsvexConfig from './mdsvex.config.js';
import { lessonValues } from './src/bin/lesson-values.js';

/**
 * mdsvex still writes Svelte 4 idioms into what it compiles; runes mode refuses `$$props`
 * and warns about `context="module"` once per lesson.
 * @type {import('svelte/compiler').PreprocessorGroup}
 */
const runesReady = {
	name: 'runes-ready',
	markup: ({ content, filename }) =>
		filename?.endsWith('.svx')
			? {
					code: content
						.replaceAll('{...$$props}', '')
						.replaceAll('<script context="module"', '<script module')
				}
			: undefined
};

/** @type {import('@sveltejs/kit').Config} */
const config = {
	extensions: ['.svelte', '.svx'],
	preprocess: [lessonValues, vitePreprocess(), mdsvex(mdsvexConfig), runesReady],
	kit: {
		adapter: adapter({ out: process.env.RINGLAND_BUILD_OUT ?? 'build', precompress: true }),
		alias: { $lessons: 'lessons' },
		// The crib's pages register it, for themselves alone.
		serviceWorker: { register: false },
		typescript: {
			config: (made) => ({
				...made,
				// kit leaves the worker out of the project; here it is checked with the rest.
				exclude: made.exclude.filter(
					(/** @type {string} */ path) => !path.includes('service-worker')
				),
				include: [...made.include, '../lessons/**/*.svelte', '../*.config.ts', '../*.config.js']
			})
		},
		// Style attributes and video.js need inline styles; scripts carry a nonce.
		csp: {
			mode: 'nonce',
			directives: {
				'default-src': ['self'],
				'script-src': ['self'],
				'style-src': ['self', 'unsafe-inline'],
				'img-src': ['self', 'data:', 'blob:'],
				'media-src': ['self', 'blob:'],
				'font-src': ['self', 'data:'],
				'connect-src': ['self'],
				'worker-src': ['self', 'blob:'],
				'manifest-src': ['self'],
				'object-src': ['none'],
				'base-uri': ['self'],
				'frame-ancestors': ['none']
				// form-action is set in hooks: it must allow the till, whose address is configuration.
			}
		}
	}
};

export default config;
