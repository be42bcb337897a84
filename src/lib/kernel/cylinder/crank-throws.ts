import { cannot, computed, type Outcome } from '../outcome';
import { cycleDeg, evenIntervalDeg, orderFault, type Cycle } from './firing';

/**
 * Crank throws on which an order fires evenly.
 *
 * Formula: place p in the order fires at p · interval; its throw is that angle less whole turns.
 * @param order every cylinder once, in the order in which they fire
 * @returns by cylinder from 1: how far its throw lies behind that of the first to fire, degrees 0 to 360
 * Source: geometry of the crank.
 * @example evenThrowsDeg([1, 3, 4, 2], 'four-stroke') // [0, 180, 180, 0]
 */
export function evenThrowsDeg(order: readonly number[], cycle: Cycle): Outcome<number[]> {
	const fault = orderFault(order.length, order);
	if (fault) return cannot(fault);
	const interval = evenIntervalDeg(order.length, cycle);
	if (!interval.ok) return interval;
	const throws = order.map(() => 0);
	for (const [place, cylinder] of order.entries())
		throws[cylinder - 1] = ((place * cycleDeg[cycle]) / order.length) % 360;
	return computed(throws);
}

/**
 * Where a cylinder of a bank comes to its top dead centre.
 *
 * Formula: φ = pin + bank, less whole turns.
 * @param pinDeg how far its crankpin lies behind cylinder 1's, degrees, in the sense of rotation
 * @param bankDeg how far its bank leans from cylinder 1's, degrees, in the sense of rotation
 * @returns degrees 0 to 360 after cylinder 1's top dead centre
 * Source: geometry of the crank.
 * @example bankedThrowDeg(270, 90) // 0: together with cylinder 1
 */
export function bankedThrowDeg(pinDeg: number, bankDeg: number): Outcome<number> {
	if (!(Math.abs(pinDeg) <= 7200) || !(Math.abs(bankDeg) <= 7200))
		return cannot('pin and bank stand at angles in degrees');
	return computed((((pinDeg + bankDeg) % 360) + 360) % 360);
}
