import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { draftFrom, sheetDraftSchema } from '$lib/domain/data-sheets/draft/draft';
import {
	applyToDraft,
	followsOn,
	type DraftOperation
} from '$lib/domain/data-sheets/draft/operation';

const empty = draftFrom({}).draft;
const operation: fc.Arbitrary<DraftOperation> = fc.oneof(
	fc.record({
		kind: fc.constant('set' as const),
		section: fc.constantFrom('head' as const, 'dimensions' as const),
		row: fc.constantFrom('head', 'a', 'b'),
		field: fc.constantFrom('title', 'words', 'key', 'constructor', '__proto__'),
		value: fc.string({ maxLength: 5 })
	}),
	fc.record({
		kind: fc.constant('add' as const),
		section: fc.constant('dimensions' as const),
		row: fc.constantFrom('a', 'b'),
		values: fc.constant({ words: 'new', hasOwnProperty: 'x' })
	}),
	fc.record({
		kind: fc.constant('remove' as const),
		section: fc.constant('dimensions' as const),
		row: fc.constantFrom('a', 'b')
	})
);

describe('an operation on a draft', () => {
	it('applied twice is applied once, and what comes of it can be stored', () => {
		fc.assert(
			fc.property(fc.array(operation, { maxLength: 12 }), operation, (before, last) => {
				const held = before.reduce(applyToDraft, empty);
				const once = applyToDraft(held, last);
				expect(applyToDraft(once, last)).toEqual(once);
				expect(sheetDraftSchema.parse(once)).toEqual(once);
			})
		);
	});

	it('brings a row back to the place that it was taken from', () => {
		const three = ['a', 'b', 'c'].reduce(
			(held, row) =>
				applyToDraft(held, { kind: 'add', section: 'fluids', row, values: { words: row } }),
			empty
		);
		const two = applyToDraft(three, { kind: 'remove', section: 'fluids', row: 'b' });
		const back = applyToDraft(two, {
			kind: 'add',
			section: 'fluids',
			row: 'b',
			values: { words: 'b' },
			at: 1
		});
		expect(back).toEqual(three);
	});

	it('follows on only where it is typed in the same field', () => {
		const set = (field: string, value: string): DraftOperation => ({
			kind: 'set',
			section: 'head',
			row: 'head',
			field,
			value
		});
		expect(followsOn(set('title', 'a'), set('title', 'ab'))).toBe(true);
		expect(followsOn(set('title', 'a'), set('code', 'ab'))).toBe(false);
	});
});
