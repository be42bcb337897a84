import { z } from 'zod';
import type { RosterRow } from './read-roster';

/** What will happen to a row when the plan is applied. */
export type RosterOutcome = 'invite' | 'wait' | 'already' | 'fault';
export type PlannedRow = RosterRow & { outcome: RosterOutcome; faults: string[] };
export type RosterPlan = {
	rows: PlannedRow[];
	counts: Record<RosterOutcome, number>;
	freePlaces: number;
};

const email = z.email().max(254);

/**
 * The dry run: every fault of every row is named, and nothing is written. Rows get the free
 * places in the order of the list; the others wait on the roster until places are paid.
 * @param standing e-mail addresses already on this cohort's roster
 */
export function planRoster(
	rows: readonly RosterRow[],
	standing: ReadonlySet<string>,
	freePlaces: number
): RosterPlan {
	const firstLine = new Map<string, number>();
	let free = freePlaces;
	const planned = rows.map((row): PlannedRow => {
		const faults = faultsOf(row, firstLine.get(row.email));
		if (!firstLine.has(row.email)) firstLine.set(row.email, row.line);
		if (faults.length > 0) return { ...row, faults, outcome: 'fault' };
		if (standing.has(row.email)) return { ...row, faults, outcome: 'already' };
		const outcome = free > 0 ? 'invite' : 'wait';
		if (outcome === 'invite') free -= 1;
		return { ...row, faults, outcome };
	});
	const counts: Record<RosterOutcome, number> = { invite: 0, wait: 0, already: 0, fault: 0 };
	for (const { outcome } of planned) counts[outcome] += 1;
	return { rows: planned, counts, freePlaces };
}

function faultsOf(row: RosterRow, earlierLine: number | undefined): string[] {
	const faults: string[] = [];
	if (row.name === '') faults.push('The name is missing.');
	if (row.name.length > 120) faults.push('The name is longer than 120 characters.');
	if (row.email === '') faults.push('The e-mail address is missing.');
	else if (!email.safeParse(row.email).success)
		faults.push(`“${row.email.slice(0, 60)}” is not an e-mail address.`);
	else if (earlierLine !== undefined)
		faults.push(`The same e-mail address stands in line ${earlierLine}.`);
	if (row.studentNumber.length > 40)
		faults.push('The student number is longer than 40 characters.');
	return faults;
}
