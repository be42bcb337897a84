import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { figuresOf } from '$lib/domain/data-sheets/figures';
import type { DataSheet } from '$lib/domain/data-sheets/schema';
import {
	tighteningOrder,
	type TighteningOrderBody
} from '$lib/domain/questions/kinds/tightening-order';

const sheet = catalogue().courses.find(({ course }) => course.key === 'reading-failed-engines')
	?.sheet as DataSheet;

function asked(body: Partial<TighteningOrderBody>) {
	const whole: TighteningOrderBody = {
		pattern: 'crankshaft.flywheelBolts',
		direction: 'tighten',
		because: 'The face seats evenly.',
		...body
	};
	const drawn = tighteningOrder.draw(whole, 'seed', figuresOf(sheet));
	if (!drawn.ok) throw new Error(drawn.because);
	return (order: string[]) => tighteningOrder.score(whole, drawn.value, { order });
}

describe('an order that no sheet prints', () => {
	// Six bolts of the flywheel, F1 to F6 around: crossed in pairs, common practice (reference OR-F4 and on).
	const score = asked({});

	it('is right in every sound way, its mirror image too', () => {
		for (const order of [
			['F1', 'F4', 'F2', 'F5', 'F3', 'F6'],
			['F1', 'F4', 'F6', 'F3', 'F5', 'F2'],
			['F3', 'F6', 'F1', 'F4', 'F5', 'F2']
		])
			expect(score(order)).toMatchObject({ points: 1, right: true });
	});
	it('is left where a neighbour is taken first, and every bolt that would do is named', () => {
		expect(score(['F1', 'F2', 'F3', 'F4', 'F5', 'F6'])).toEqual({
			points: 1 / 6,
			right: false,
			explain: 'The first wrong step is 2: you took F2, and F4 comes there.'
		});
		expect(score(['F1', 'F4', 'F2', 'F3', 'F5', 'F6']).explain).toContain('F5 comes there');
	});
	it('that is unfinished earns its sound steps, and never all', () => {
		expect(score(['F1', 'F4', 'F2'])).toMatchObject({ points: 3 / 6, right: false });
		expect(score(['F1', 'F4', 'F4', 'F2', 'F5', 'F3'])).toMatchObject({ points: 2 / 6 });
		expect(score(['F1', 'F4', 'F2', 'F5', 'F3', 'F6', 'F6'])).toMatchObject({
			points: 5 / 6,
			right: false
		});
		expect(score([])).toMatchObject({ points: 0, right: false });
	});
	it('is loosened crosswise as well', () => {
		const loosen = asked({ direction: 'loosen' });
		expect(loosen(['F2', 'F5', 'F3', 'F6', 'F1', 'F4'])).toMatchObject({ points: 1 });
		expect(loosen(['F2', 'F3', 'F5', 'F6', 'F1', 'F4'])).toMatchObject({ points: 1 / 6 });
	});
});

describe('an order that the sheet prints', () => {
	it('has one way only, and for loosening its reverse', () => {
		const printed = sheet.patterns.find(({ key }) => key === 'head.bolts')?.printedOrder ?? [];
		const mirrored = printed.map((id) => (id.startsWith('A') ? 'B' : 'A') + id.slice(1));
		const tighten = asked({ pattern: 'head.bolts' });
		expect(tighten(printed)).toMatchObject({ points: 1, right: true });
		expect(tighten(mirrored)).toMatchObject({ points: 0, right: false });
		const loosen = asked({ pattern: 'head.bolts', direction: 'loosen' });
		expect(loosen(printed.toReversed())).toMatchObject({ points: 1, right: true });
		expect(loosen(printed)).toMatchObject({ right: false });
	});
});
