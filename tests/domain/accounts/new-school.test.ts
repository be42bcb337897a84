import { describe, expect, it } from 'vitest';
import { newSchool } from '$lib/domain/accounts/new-school';

const good = {
	schoolName: 'Averholm Trade School',
	town: 'Averholm',
	slug: 'averholm',
	locale: 'en-GB',
	timeZone: 'Europe/Oslo',
	currency: 'eur'
};

describe('a new school', () => {
	it('is taken as given, its currency in capitals', () => {
		expect(newSchool.parse(good)).toEqual({ ...good, currency: 'EUR' });
	});

	it.each([
		['slug', 'Averholm School'],
		['slug', 'av'],
		['slug', '-averholm'],
		['locale', 'not a tag'],
		['timeZone', 'Averholm/Quay'],
		['currency', 'euro'],
		['schoolName', ' ']
	])('is refused with %s "%s"', (field, value) => {
		const parsed = newSchool.safeParse({ ...good, [field]: value });
		expect(parsed.error?.issues.map((one) => one.path.join('.'))).toEqual([field]);
	});
});
