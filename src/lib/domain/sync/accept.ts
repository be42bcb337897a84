/** Where a write stands: the epoch its device opened, and its number within that epoch. */
export type Place = { epoch: number; number: number };

export type Held = {
	/** The epoch of the device that opened the thing last. */
	openEpoch: number;
	/** The place of what is stored now; null when nothing is. */
	last: Place | null;
};

export type Verdict =
	| 'take' // newer than what is stored
	| 'older' // the same device wrote something newer already: keep as a fact, change nothing
	| 'same' // this very write is stored
	| 'other-epoch'; // another device has opened it since: 409, keep as a fact

/**
 * Orders writes by (epoch, number). Whatever order they arrive in, and however often, what is
 * stored in the end is the newest of the open epoch. Clocks play no part: a phone's may be wrong.
 */
export function accept(held: Held, incoming: Place): Verdict {
	if (incoming.epoch !== held.openEpoch) return 'other-epoch';
	if (held.last === null || held.last.epoch < incoming.epoch) return 'take';
	if (incoming.number === held.last.number) return 'same';
	return incoming.number > held.last.number ? 'take' : 'older';
}
