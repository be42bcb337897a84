import type { Place } from './accept';

/**
 * Whether a write that a device could not send may go again under the epoch that it opens now.
 * Not when the same thing was written in a later epoch: another device has spoken since, and what
 * waited here would undo it. Such a write is still sent under its old epoch, to be kept as a fact.
 */
export function mayResend(held: Place, standing: Place | null): boolean {
	return standing === null || standing.epoch <= held.epoch;
}
