import type { Config } from 'tailwindcss';

/** The trade's colours by name; their values for vellum and blueprint stand in app.css. */
const paint = (name: string) => `var(--${name})`;

export default {
	content: ['./src/**/*.{svelte,ts,html}', './lessons/**/*.{svx,svelte}'],
	theme: {
		extend: {
			colors: {
				vellum: paint('vellum'),
				sheet: paint('sheet'),
				ink: { DEFAULT: paint('ink'), soft: paint('ink-soft') },
				rule: paint('rule'),
				layout: { DEFAULT: paint('layout'), wash: paint('layout-wash') },
				brass: { DEFAULT: paint('brass'), wash: paint('brass-wash') },
				redlead: { DEFAULT: paint('redlead'), wash: paint('redlead-wash') },
				chromate: { DEFAULT: paint('chromate'), wash: paint('chromate-wash') }
			},
			fontFamily: {
				label: ['"Barlow Condensed"', 'sans-serif'],
				body: ['"Atkinson Hyperlegible Next Variable"', 'sans-serif'],
				figure: ['"Spline Sans Mono Variable"', 'monospace']
			},
			maxWidth: { measure: '43rem' }
		}
	}
} satisfies Config;
