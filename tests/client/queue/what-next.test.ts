import { describe, expect, it } from 'vitest';
import { backoffMs, whatNext } from '$lib/client/queue/what-next';

const problem = (status: number) => whatNext({ kind: 'problem', status, detail: 'so', fields: {} });

describe('what the queue does after an answer', () => {
	it('lets go of a response only when it is saved or the sitting is over', () => {
		expect(whatNext({ kind: 'done', value: { verdict: 'take' } })).toBe('saved');
		expect(whatNext({ kind: 'done', value: { verdict: 'same' } })).toBe('saved');
		expect(whatNext({ kind: 'done', value: { verdict: 'older' } })).toBe('saved');
		expect(problem(410)).toBe('over');
	});

	it.each([408, 425, 429, 500, 507])('keeps it and tries again after %i', (status) => {
		expect(problem(status)).toBe('again');
	});

	it.each([400, 403, 404, 409, 413])(
		'sets it aside after %i, and does not hold up the rest',
		(status) => {
			expect(problem(status)).toBe('refused');
		}
	);

	it('waits for the network, for the person, and stops for another device', () => {
		expect(whatNext({ kind: 'offline' })).toBe('offline');
		expect(whatNext({ kind: 'signed-out' })).toBe('signed-out');
		expect(whatNext({ kind: 'done', value: { verdict: 'other-epoch' } })).toBe('other-device');
	});

	it('waits longer each time, never more than half a minute', () => {
		expect([0, 1, 2, 3, 4, 5, 60].map(backoffMs)).toEqual([
			1000, 2000, 4000, 8000, 16_000, 30_000, 30_000
		]);
	});
});
