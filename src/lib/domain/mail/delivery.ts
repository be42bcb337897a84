export type Delivery = 'sent' | 'refused' | 'later' | 'unsure';

/** Where a message stands after one try. "Unsure" is shown to the office and never sent again by itself. */
export function mailStateAfter(outcome: Delivery): 'sent' | 'refused' | 'waiting' | 'unsure' {
	return outcome === 'later' ? 'waiting' : outcome;
}
