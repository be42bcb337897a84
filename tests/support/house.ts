import { copyFileSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Catalogue } from '$lib/content/catalogue';
import type { Role } from '$lib/domain/actor';
import { anyone, system, type Actor } from '$lib/domain/actor';
import { ulid } from '$lib/domain/ids';
import { seeded } from '$lib/kernel/random/random';
import { readEnvironment } from '$lib/server/config/env';
import { openDatabase } from '$lib/server/data/database';
import { migrate } from '$lib/server/data/migrations';
import { accounts, mails, people, personRoles, schools } from '$lib/server/data/models';
import { membershipsOf } from '$lib/server/data/queries/schools';
import { find, insert, select } from '$lib/server/data/rows';
import { commonScope, schoolScope, type CommonScope } from '$lib/server/data/scope';
import { inTransaction, writesDone } from '$lib/server/data/transaction';
import { makeImages } from '$lib/server/gateways/images';
import { makeMailer } from '$lib/server/gateways/mail';
import { hashPassword } from '$lib/server/gateways/passwords/passwords';
import { makePdfPrinter } from '$lib/server/gateways/pdf';
import { openSigning } from '$lib/server/gateways/signing';
import { openDiskStorage } from '$lib/server/gateways/storage';
import { makeTill } from '$lib/server/gateways/stripe';
import { makeLog } from '$lib/server/log/log';
import type { House } from '$lib/server/services/house';
import type { Caller } from '$lib/server/services/use-case';

export const password = 'four plain bench words';

export type TestHouse = House & {
	/** Moves the clock, which stands still otherwise. */
	passMs: (ms: number) => void;
	/** Does every job that is due, as the worker would. */
	work: () => Promise<void>;
	/** The secret links of the newest letter to somebody that waits unsent. */
	linksOfLetter: (to: string) => Promise<{ kind: string; links: Record<string, string> }>;
	/** A scope for looking into the file from a test. */
	look: CommonScope;
	/** A scope in a transaction, for laying rows that no use case makes. */
	lay: (work: (scope: CommonScope) => Promise<void>) => Promise<void>;
	addSchool: (slug: string, facts?: { timeZone?: string }) => Promise<string>;
	addPerson: (schoolId: string, name: string, roles: Role[]) => Promise<TestPerson>;
	close: () => Promise<void>;
};

export type TestPerson = {
	accountId: string;
	personId: string;
	email: string;
	/** As this person, in the school that they were added to; the actor is read anew each time. */
	caller: (requestKey?: string) => Promise<Caller<string>>;
};

type Wanted = {
	now?: string;
	environment?: Record<string, string>;
	catalogue?: Partial<Catalogue>;
};

const nothingTaught: Catalogue = {
	courses: [],
	engines: [],
	courseByKey: () => undefined,
	lessonByKey: () => undefined
};

/** Migrated once for each test process; every house starts from a copy. */
let template: Promise<string> | undefined;

async function migratedFile(): Promise<string> {
	const file = join(mkdtempSync(join(tmpdir(), 'ringland-template-')), 'ringland.sqlite');
	const database = openDatabase(file);
	await migrate(database);
	await database.sequelize.query('PRAGMA wal_checkpoint(TRUNCATE)');
	await database.close();
	process.once('exit', () => rmSync(join(file, '..'), { recursive: true, force: true }));
	return file;
}

/**
 * A house with the real database file, real gateways and a clock that stands. Mail and payments
 * point at ports that nobody listens on, unless the environment says otherwise; letters wait.
 */
export async function makeHouse({ now, environment, catalogue }: Wanted = {}): Promise<TestHouse> {
	const folder = mkdtempSync(join(tmpdir(), 'ringland-house-'));
	const file = join(folder, 'ringland.sqlite');
	copyFileSync(await (template ??= migratedFile()), file);
	const database = openDatabase(file);
	const config = readEnvironment({ DATA_DIR: folder, LOG_LEVEL: 'silent', ...environment });
	let clock = Date.parse(now ?? '2026-03-02T08:00:00.000Z');
	const random = seeded(folder);
	const house: House = {
		config,
		database,
		log: makeLog(config.LOG_LEVEL),
		catalogue: { ...nothingTaught, ...catalogue },
		gateways: {
			images: makeImages(),
			mailer: makeMailer({ smtpUrl: config.SMTP_URL ?? 'smtp://127.0.0.1:9' }),
			pdf: makePdfPrinter(),
			signing: await openSigning(folder),
			storage: await openDiskStorage(folder),
			till: makeTill({
				secretKey: config.STRIPE_SECRET_KEY ?? 'sk_test_nobody',
				webhookSecret: config.STRIPE_WEBHOOK_SECRET ?? 'whsec_nobody',
				apiBase: config.STRIPE_API_BASE ?? 'http://127.0.0.1:9'
			})
		},
		now: () => new Date(clock),
		chance: (bytes) => Uint8Array.from({ length: bytes }, () => random.integer(0, 255))
	};
	const look = commonScope(database, null);
	const newId = () => ulid(clock, house.chance(10));
	const lay: TestHouse['lay'] = (work) =>
		inTransaction(database, (transaction) => work(commonScope(database, transaction)));

	async function addSchool(slug: string, { timeZone = 'UTC' } = {}): Promise<string> {
		const id = newId();
		const createdAt = house.now().toISOString();
		const facts = { locale: 'en-GB', timeZone, currency: 'EUR', createdAt };
		await lay((scope) => insert(scope, schools, { id, slug, name: slug, town: slug, ...facts }));
		return id;
	}

	/** Signs in with `password`; the address is the name, in small letters. */
	async function addPerson(schoolId: string, name: string, roles: Role[]): Promise<TestPerson> {
		const email = `${name.toLowerCase().replace(/\W+/g, '.')}@school.example`;
		const createdAt = house.now().toISOString();
		const personId = newId();
		const known = await find(look, accounts, { email });
		const accountId = known?.id ?? newId();
		const passwordHash = await hashPassword(password);
		await lay(async (scope) => {
			const account = { id: accountId, email, name, passwordHash, createdAt };
			if (!known) await insert(scope, accounts, { ...account, emailVerifiedAt: createdAt });
			const here = schoolScope(database, schoolId, scope.transaction);
			const person = { id: personId, accountId, name, createdAt };
			await insert(here, people, { ...person, studentNumber: null, extraTimePercent: 0 });
			for (const role of roles)
				await insert(here, personRoles, { personId, role, givenAt: createdAt });
		});
		const caller = async (requestKey?: string) => {
			const memberships = await membershipsOf(look, accountId);
			const who = { accountId, sessionId: 'no-session', email, name, memberships };
			return { house, actor: { kind: 'account' as const, ...who }, schoolId, requestKey };
		};
		return { accountId, personId, email, caller };
	}

	return Object.assign(house, {
		look,
		lay,
		addSchool,
		addPerson,
		passMs: (ms: number) => void (clock += ms),
		async work() {
			// Here, not above: a test that runs no job need not load every service.
			const { workOnce } = await import('$lib/server/worker/loop');
			while (await workOnce(house));
		},
		async linksOfLetter(to: string) {
			const newest = { order: [['id', 'desc']] as const, limit: 1 };
			const [mail] = await select(look, mails, { recipient: to }, newest);
			if (!mail?.sealed) throw new Error(`no letter with a link waits for ${to}`);
			const opened = house.gateways.signing.open(mail.sealed, mail.id);
			return { kind: mail.kind, links: JSON.parse(opened) as Record<string, string> };
		},
		async close() {
			await writesDone(database);
			await Promise.all([house.gateways.images.close(), house.gateways.pdf.close()]);
			await database.close();
			rmSync(folder, { recursive: true, force: true });
		}
	});
}

/** Somebody without an account, and the house itself; neither is in a school. */
export function callerAs(house: House, actor: Actor = anyone): Caller {
	return { house, actor, schoolId: undefined };
}

export function asSystem(house: House, schoolId?: string): Caller {
	return { house, actor: system, schoolId };
}
