import { z } from 'zod';

const shortText = (missing: string) => z.string().trim().min(1, missing).max(120);

/** What a school is called and how it writes dates and money. */
export const newSchool = z.object({
	schoolName: shortText('Give the school a name.'),
	town: shortText('Say where the school is.'),
	slug: z
		.string()
		.trim()
		.regex(
			/^[a-z0-9](?:[a-z0-9-]{1,38}[a-z0-9])$/,
			'Use 3 to 40 small letters, digits and hyphens: it stands in the address of every page.'
		),
	locale: z.string().trim().refine(isLocale, 'Give a language tag, such as en-GB.'),
	timeZone: z.string().trim().refine(isTimeZone, 'Give a time zone, such as Europe/Oslo.'),
	currency: z
		.string()
		.trim()
		.toUpperCase()
		.regex(/^[A-Z]{3}$/, 'Give a currency by its three letters, such as EUR.')
});

function isLocale(text: string): boolean {
	try {
		return Intl.DateTimeFormat.supportedLocalesOf(text).length === 1;
	} catch {
		return false;
	}
}

function isTimeZone(text: string): boolean {
	try {
		return new Intl.DateTimeFormat('en', { timeZone: text }).resolvedOptions().timeZone !== '';
	} catch {
		return false;
	}
}
