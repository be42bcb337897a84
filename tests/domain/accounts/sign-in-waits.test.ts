import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addressBlock } from '$lib/domain/accounts/address-block';
import { deviceWords } from '$lib/domain/accounts/device-words';
import {
	askForTurn,
	tryGivenBack,
	waitAfterMs,
	waitRules,
	waitWords,
	type Tries
} from '$lib/domain/accounts/sign-in-waits';

const rule = waitRules.account;
const start = Date.parse('2026-03-02T08:00:00Z');

describe('waits at sign-in', () => {
	it('let five tries through, then hold the sixth for half a minute, then a minute', () => {
		let tries: Tries | undefined;
		for (let i = 0; i < 5; i++) {
			const turn = askForTurn(tries, rule, new Date(start + i));
			if (turn.kind !== 'go') throw new Error(`try ${i + 1} was held up`);
			tries = turn.tries;
		}
		const sixth = askForTurn(tries, rule, new Date(start + 10));
		expect(sixth).toEqual({ kind: 'wait', until: new Date(start + 4 + 30_000) });
		const later = askForTurn(tries, rule, new Date(start + 4 + 30_000));
		expect(later.kind === 'go' && later.tries.waitUntil).toBe(
			new Date(start + 4 + 30_000 + 60_000).toISOString()
		);
	});

	it('never shrink with more failures, and end at the longest', () => {
		fc.assert(
			fc.property(fc.integer({ min: 1, max: 2000 }), (failures) => {
				const here = waitAfterMs(failures, rule);
				return here <= waitAfterMs(failures + 1, rule) && here <= rule.longestWaitMs;
			})
		);
	});

	it('forget after a day without a try', () => {
		const held: Tries = { failures: 40, lastAt: new Date(start).toISOString(), waitUntil: null };
		const turn = askForTurn(held, rule, new Date(start + rule.forgottenAfterMs + 1));
		expect(turn.kind === 'go' && turn.tries.failures).toBe(1);
	});

	it('give a right try back, and its wait with it', () => {
		const held: Tries = {
			failures: rule.free,
			lastAt: new Date(start).toISOString(),
			waitUntil: new Date(start + 30_000).toISOString()
		};
		expect(tryGivenBack(held, rule)).toMatchObject({ failures: 4, waitUntil: null });
	});

	it.each([
		[1, '1 second'],
		[30_000, '30 seconds'],
		[60_000, '60 seconds'],
		[120_000, '2 minutes'],
		[121_000, '3 minutes'],
		[3_600_000, '60 minutes']
	])('%i ms is said as "%s"', (ms, words) => expect(waitWords(ms)).toBe(words));
});

describe('an address block', () => {
	it.each([
		['192.0.2.7', '192.0.2.7'],
		['::ffff:192.0.2.7', '192.0.2.7'],
		['2001:DB8:0:1:2:3:4:5', '2001:db8:0:1::/64'],
		['2001:db8::9', '2001:db8:0:0::/64'],
		['2001:0db8:0000:0001::', '2001:db8:0:1::/64'],
		['fe80::1%eth0', 'fe80:0:0:0::/64'],
		['64:ff9b::192.0.2.1', '64:ff9b:0:0::/64'],
		['::1', '0:0:0:0::/64'],
		['not an address', 'not an address']
	])('of %s is %s', (address, block) => expect(addressBlock(address)).toBe(block));
});

describe('a device', () => {
	it.each([
		['Mozilla/5.0 (X11; Linux x86_64; rv:140.0) Gecko/20100101 Firefox/140.0', 'Firefox on Linux'],
		[
			'Mozilla/5.0 (Windows NT 10.0) AppleWebKit/537.36 Chrome/150.0 Safari/537.36 Edg/150.0',
			'Edge on Windows'
		],
		[
			'Mozilla/5.0 (iPhone; CPU iPhone OS 18_0 like Mac OS X) AppleWebKit/605 Version/18.0 Safari/604',
			'Safari on iPhone'
		],
		['curl/8', 'An unnamed device'],
		[null, 'An unnamed device']
	])('is named from %s', (agent, words) => expect(deviceWords(agent)).toBe(words));
});
