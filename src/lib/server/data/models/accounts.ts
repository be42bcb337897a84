import type { Role } from '$lib/domain/actor';
import { commonTable, instant, integer, json, key, nullable, schoolTable, text } from '../table';

export const schools = commonTable('schools', {
	id: key(),
	slug: text(),
	name: text(),
	town: text(),
	locale: text(),
	timeZone: text(),
	currency: text(),
	createdAt: instant()
});

export const accounts = commonTable('accounts', {
	id: key(),
	email: text(),
	name: text(),
	passwordHash: nullable(text()),
	emailVerifiedAt: nullable(instant()),
	createdAt: instant()
});

export const sessions = commonTable('sessions', {
	id: key(),
	accountId: text(),
	tokenHash: text(),
	device: text(),
	address: text(),
	createdAt: instant(),
	seenAt: instant(),
	expiresAt: instant()
});

export type TokenPurpose =
	'sign-in' | 'password' | 'invitation' | 'role-invitation' | 'first-school';

/** One-time links: only the hash is kept, and one atomic delete uses a token up. */
export const tokens = commonTable('tokens', {
	tokenHash: key(),
	purpose: text<TokenPurpose>(),
	identifier: text(),
	createdAt: instant(),
	expiresAt: instant()
});

/** Devices that have signed in before: they do not share the account's wait with a stranger. */
export const knownDevices = commonTable('known_devices', {
	accountId: key(),
	deviceHash: key(),
	seenAt: instant()
});

export const signInAttempts = commonTable('sign_in_attempts', {
	bucket: key(),
	failures: integer(),
	lastAt: instant(),
	waitUntil: nullable(instant())
});

/** Somebody in a school. The ledger names people by this id only. */
export const people = schoolTable('people', {
	id: key(),
	accountId: text(),
	name: text(),
	studentNumber: nullable(text()),
	extraTimePercent: integer(),
	createdAt: instant()
});

export const personRoles = schoolTable('person_roles', {
	personId: key(),
	role: { ...text<Role>(), key: true },
	givenAt: instant()
});

/** Somebody asked to work in the school; accepting makes the person and gives the roles. */
export const roleInvitations = schoolTable('role_invitations', {
	id: key(),
	email: text(),
	name: text(),
	roles: json<Role[]>(),
	invitedBy: text(),
	invitedAt: instant(),
	acceptedAt: nullable(instant())
});

/** For a school's own scripts. */
export const apiTokens = schoolTable('api_tokens', {
	id: key(),
	name: text(),
	tokenHash: text(),
	scopes: json<string[]>(),
	createdBy: text(),
	createdAt: instant(),
	lastUsedAt: nullable(instant()),
	revokedAt: nullable(instant())
});

/** The answer given to a write, kept so that the same request sent twice is done once. */
export const requestKeys = commonTable('request_keys', {
	owner: key(),
	requestKey: key(),
	useCase: text(),
	requestHash: text(),
	answer: nullable(json<unknown>()),
	at: instant()
});
