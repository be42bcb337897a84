import { freePlaces, rosterOf } from '../../data/queries/cohorts';
import { makeToken } from '../../data/queries/tokens';
import { schoolById } from '../../data/queries/schools';
import { rosterEntries } from '../../data/models';
import { update } from '../../data/rows';
import type { SchoolScope } from '../../data/scope';
import type { House } from '../house';
import type { Work, Written } from '../use-case';

type Pen = Pick<Work<unknown, SchoolScope>, 'house' | 'scope' | 'at'> & Written;
type Entry = { id: string; email: string; name: string };
type Cohort = { id: string; title: string; courseTitle: string };

export const invitationHeldForDays = 14;

/**
 * Gives the free places to those who wait, in the order of the roster, and invites them.
 * Called in the transaction that opened the places or wrote the roster.
 */
export async function inviteWaiting(pen: Pen, cohort: Cohort): Promise<number> {
	const { scope, at } = pen;
	const free = await freePlaces(scope, cohort.id);
	const waiting = (await rosterOf(scope, cohort.id)).filter((one) => one.state === 'waiting');
	let invited = 0;
	for (const [index, entry] of waiting.entries()) {
		const place = free[index];
		if (!place) break;
		await update(
			scope,
			rosterEntries,
			{ id: entry.id, state: 'waiting' },
			{ state: 'invited', placeId: place.id, invitedAt: at.toISOString() }
		);
		await sendInvitation(pen, cohort, entry);
		invited += 1;
	}
	return invited;
}

/** A new link; the one before it, if any, ends. */
export async function sendInvitation(pen: Pen, cohort: Cohort, entry: Entry): Promise<void> {
	const { scope, house, at } = pen;
	const school = await schoolById(scope, scope.schoolId);
	const token = await makeToken(scope, house.chance(32), {
		purpose: 'invitation',
		identifier: `${scope.schoolId}:${entry.id}`,
		at,
		heldForMs: invitationHeldForDays * 24 * 3600 * 1000
	});
	await pen.mail({
		kind: 'invitation',
		to: entry.email,
		payload: {
			name: entry.name,
			schoolName: school?.name ?? '',
			courseTitle: cohort.courseTitle,
			cohortTitle: cohort.title,
			heldForDays: invitationHeldForDays
		},
		links: { link: invitationLink(house, token) }
	});
	await pen.record({ kind: 'invitation-sent', subject: entry.id, data: { cohort: cohort.id } });
}

function invitationLink(house: House, token: string): string {
	return `${house.config.ORIGIN}/invitation/${token}`;
}
