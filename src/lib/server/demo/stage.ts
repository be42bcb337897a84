import { createHash } from 'node:crypto';
import type { Actor, Role } from '$lib/domain/actor';
import { membershipsOf } from '../data/queries/schools';
import { commonScope, schoolScope } from '../data/scope';
import { inTransaction } from '../data/transaction';
import { accounts, people, personRoles, schools } from '../data/models';
import { find, insert } from '../data/rows';
import { hashPassword } from '../gateways/passwords/passwords';
import type { House } from '../services/house';
import type { Caller } from '../services/use-case';
import { demoPassword } from '$lib/domain/accounts/demo-password';

/**
 * The demo is played through the same use cases as everything else, on a clock of its own. Each
 * act has a request key made of its name: an act that was played is not played again, so that a
 * seed that was interrupted goes on where it stopped.
 */
export type Stage = {
	house: House;
	/** Moves the stage's clock: days after the opening, and the hour. */
	at: (day: number, hour?: number, minute?: number) => void;
	day: (day: number) => string;
	as: (who: Actor, schoolId: string, act: string) => Caller;
	actor: (email: string) => Promise<Actor>;
	/** An id or a key that is the same each time for the same name. */
	named: (name: string) => string;
};

const dayMs = 24 * 3600 * 1000;
const crockford = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';

export function openStage(real: House, opening: Date): Stage {
	let now = opening.getTime();
	const house: House = { ...real, now: () => new Date((now += 1000)) };
	const named = (name: string) => ulidOf(opening, name);
	return {
		house,
		named,
		at(day, hour = 9, minute = 0) {
			now = opening.getTime() + day * dayMs + hour * 3600_000 + minute * 60_000;
		},
		day: (day) => new Date(opening.getTime() + day * dayMs).toISOString().slice(0, 10),
		as: (actor, schoolId, act) => ({ house, actor, schoolId, requestKey: named(`act/${act}`) }),
		async actor(email) {
			const scope = commonScope(house.database, null);
			const account = await find(scope, accounts, { email });
			if (!account) throw new Error(`nobody plays ${email}`);
			return {
				kind: 'account',
				accountId: account.id,
				sessionId: '',
				email,
				name: account.name,
				memberships: await membershipsOf(scope, account.id)
			};
		}
	};
}

/** A ULID whose chance part is a hash of the name. */
function ulidOf(opening: Date, name: string): string {
	const bytes = createHash('sha256').update(`demo/${name}`).digest();
	let tail = '';
	for (let i = 0; i < 16; i++) tail += crockford.charAt((bytes[i] ?? 0) & 31);
	let time = '';
	for (let rest = opening.getTime(), i = 0; i < 10; i++, rest = Math.floor(rest / 32))
		time = crockford.charAt(rest % 32) + time;
	return time + tail;
}

export type SchoolCast = {
	slug: string;
	name: string;
	town: string;
	staff: readonly { email: string; name: string; roles: readonly Role[] }[];
};

/** The school itself and its staff: what exists before anybody can act. */
export async function openSchool(stage: Stage, cast: SchoolCast): Promise<string> {
	const { house, named } = stage;
	const schoolId = named(`school/${cast.slug}`);
	const passwordHash = await hashPassword(demoPassword);
	await inTransaction(house.database, async (transaction) => {
		const common = commonScope(house.database, transaction);
		if (await find(common, schools, { id: schoolId })) return;
		const createdAt = house.now().toISOString();
		const { slug, name, town } = cast;
		await insert(common, schools, {
			id: schoolId,
			slug,
			name,
			town,
			locale: 'en-GB',
			timeZone: 'Europe/Oslo',
			currency: 'EUR',
			createdAt
		});
		const scope = schoolScope(house.database, schoolId, transaction);
		for (const one of cast.staff) {
			const accountId = named(`account/${one.email}`);
			const personId = named(`person/${one.email}`);
			await insert(common, accounts, {
				id: accountId,
				email: one.email,
				name: one.name,
				passwordHash,
				emailVerifiedAt: createdAt,
				createdAt
			});
			await insert(scope, people, {
				id: personId,
				accountId,
				name: one.name,
				studentNumber: null,
				extraTimePercent: 0,
				createdAt
			});
			for (const role of one.roles)
				await insert(scope, personRoles, { personId, role, givenAt: createdAt });
		}
	});
	return schoolId;
}
