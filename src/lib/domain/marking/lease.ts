/** How long a submission stays with the marker who took it; each look at it begins anew. */
export const leaseMinutes = 30;

export type Lease = { markerId: string; untilAt: string };

export function leaseUntil(at: Date): string {
	return new Date(at.getTime() + leaseMinutes * 60_000).toISOString();
}

/** Who holds the work now; a lease that ran out holds nothing. */
export function holderNow(lease: Lease | undefined, at: Date): string | null {
	return lease && lease.untilAt > at.toISOString() ? lease.markerId : null;
}
