import { cannot, computed, type Outcome } from './outcome';

/**
 * The last step of every sum: a number goes out, anything else becomes a sentence. No page, mark
 * or certificate ever prints NaN or Infinity, whatever was typed.
 */
export function computedNumber(value: number): Outcome<number> {
	return Number.isFinite(value)
		? computed(value)
		: cannot('the figures give no number: look for a slip in one of them');
}
