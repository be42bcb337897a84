import { computed, type Outcome } from '../../outcome';

/** One figure of a sum that gives several. */
export function part<T>(found: Outcome<T>, of: (value: T) => number): Outcome<number> {
	return found.ok ? computed(of(found.value)) : found;
}
