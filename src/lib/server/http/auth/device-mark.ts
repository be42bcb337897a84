import type { RequestEvent } from '@sveltejs/kit';
import { hmacHex, sameDigest, sha256Hex } from '../../gateways/signing';
import type { House } from '../../services/house';
import { cookieName, cookieOptions } from './cookies';

const heldForS = 365 * 24 * 3600;

/**
 * The mark of a browser that has signed in before: a random number and this server's signature
 * under it, so that nobody can make marks up. It names no one and opens nothing; it only spares
 * its owner a wait that strangers caused.
 * @returns the hash under which it is known, or null for a browser without a mark of ours
 */
export function readDeviceMark(event: RequestEvent): string | null {
	const { house } = event.locals;
	const [id, signature] = (event.cookies.get(nameOf(house)) ?? '').split('.');
	if (!id || !signature || !sameDigest(sign(house, id), signature)) return null;
	return sha256Hex(id);
}

/** Renews the mark, or makes one. @returns its hash, and the cookie for answers made by hand */
export function keepDeviceMark(event: RequestEvent): { hash: string; setCookie: string } {
	const { house, keptDevice } = event.locals;
	const held = readDeviceMark(event) === null ? undefined : event.cookies.get(nameOf(house));
	const value = held ?? keptDevice ?? newMark(house);
	event.locals.keptDevice = value;
	const options = { ...cookieOptions(house.config.ORIGIN), maxAge: heldForS };
	event.cookies.set(nameOf(house), value, options);
	const setCookie = event.cookies.serialize(nameOf(house), value, options);
	return { hash: sha256Hex(value.split('.')[0] ?? ''), setCookie };
}

function newMark(house: House): string {
	const id = Buffer.from(house.chance(16)).toString('base64url');
	return `${id}.${sign(house, id)}`;
}

function nameOf(house: House): string {
	return cookieName(house.config.ORIGIN, 'device');
}

function sign(house: House, id: string): string {
	return hmacHex(house.gateways.signing.keyFor('known-device'), id);
}
