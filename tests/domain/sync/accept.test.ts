import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { accept, type Place } from '$lib/domain/sync/accept';
import { mayResend } from '$lib/domain/sync/may-resend';

const place = fc.record({ epoch: fc.integer({ min: 1, max: 4 }), number: fc.nat({ max: 12 }) });

/** What stands after writes have arrived in this order. */
function standingAfter(arrivals: readonly Place[], openEpoch: number): Place | null {
	let last: Place | null = null;
	for (const one of arrivals) if (accept({ openEpoch, last }, one) === 'take') last = one;
	return last;
}

describe('accept', () => {
	it('leaves the newest of the open epoch standing, in whatever order and however often', () => {
		fc.assert(
			fc.property(
				fc.array(place, { maxLength: 20 }),
				fc.integer({ min: 1, max: 4 }),
				(all, open) => {
					const numbers = all.filter((one) => one.epoch === open).map((one) => one.number);
					const wanted = numbers.length > 0 ? Math.max(...numbers) : undefined;
					expect(standingAfter(all, open)?.number).toBe(wanted);
					expect(standingAfter([...all, ...all].reverse(), open)?.number).toBe(wanted);
				}
			)
		);
	});

	it('never takes what comes from another epoch, older or invented', () => {
		fc.assert(
			fc.property(place, fc.integer({ min: 1, max: 4 }), fc.option(place), (one, open, last) => {
				fc.pre(one.epoch !== open);
				expect(accept({ openEpoch: open, last }, one)).toBe('other-epoch');
			})
		);
	});

	it('takes the first write of a new epoch over any number of the one before', () => {
		expect(accept({ openEpoch: 2, last: { epoch: 1, number: 99 } }, { epoch: 2, number: 1 })).toBe(
			'take'
		);
	});

	it('knows a repeat from an older write', () => {
		const held = { openEpoch: 1, last: { epoch: 1, number: 5 } };
		expect(accept(held, { epoch: 1, number: 5 })).toBe('same');
		expect(accept(held, { epoch: 1, number: 4 })).toBe('older');
	});
});

describe('mayResend', () => {
	it('goes again where nobody has answered, or only this device before', () => {
		expect(mayResend({ epoch: 1, number: 3 }, null)).toBe(true);
		expect(mayResend({ epoch: 2, number: 3 }, { epoch: 1, number: 9 })).toBe(true);
		expect(mayResend({ epoch: 1, number: 3 }, { epoch: 1, number: 2 })).toBe(true);
	});

	it('never undoes what another device gave later', () => {
		fc.assert(
			fc.property(place, place, (held, standing) => {
				fc.pre(standing.epoch > held.epoch);
				expect(mayResend(held, standing)).toBe(false);
			})
		);
	});
});
