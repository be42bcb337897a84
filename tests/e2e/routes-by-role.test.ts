import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { APIRequestContext } from '@playwright/test';
import { demoPassword, expect, signIn, test } from './support/test';
import { photograph } from './support/photograph';
import { rowsOf } from './support/rows';

/** Who of Averholm may; everybody else gets "nothing here", every one of Korrig too. */
const own = 'student'; // whose work the addresses below name
const cast = ['student', 'student2', 'instructor', 'instructor2', 'verifier', 'office'] as const;
type Player = (typeof cast)[number];
const instructors: Player[] = ['instructor', 'instructor2'];
const staff: Player[] = [...instructors, 'verifier', 'office'];
const all: Player[] = ['student', 'student2', ...staff];

type Line = {
	/** Who may read it; `anyone` for public pages, `signed-in` for an account's own. */
	read?: Player[] | 'anyone' | 'signed-in';
	/** Actions by name, each with who may and a form that parses. */
	actions?: Record<
		string,
		{ may: Player[] | 'anyone' | 'signed-in'; form?: Record<string, string> }
	>;
	/** Writes of the API: who may, and a body that parses. */
	writes?: { method: 'POST' | 'DELETE'; may: Player[]; body: Record<string, unknown> };
};

const ulid = '01ARZ3NDEKTSV4RRFFQ69G5FAV';
const student = { may: [own] as Player[] };
const office = (form: Record<string, string> = {}) => ({ may: ['office'] as Player[], form });
const byInstructors = (form: Record<string, string> = {}) => ({ may: instructors, form });

/** One line a route. A route that is missing here, or here and not there, fails the first test. */
const table: Record<string, Line> = {
	'/(public)': { read: 'anyone' },
	'/(public)/check': { read: 'anyone' },
	'/(public)/check/[code]': { read: 'anyone' },
	'/(public)/crib': { read: 'anyone' },
	'/(public)/crib/[calculator]': { read: 'anyone' },
	'/(public)/data-sheets': { read: 'anyone' },
	'/(public)/data-sheets/[school]/[sheet]': { read: 'anyone' },
	'/(public)/data-sheets/[school]/[sheet].csv': { read: 'anyone' },
	'/(public)/data-sheets/[school]/[sheet].json': { read: 'anyone' },
	'/(public)/data-sheets/index.json': { read: 'anyone' },
	'/(public)/prospectus': { read: 'anyone' },
	'/(auth)/account': {
		read: 'signed-in',
		actions: {
			end: { may: 'signed-in', form: { sessionId: ulid } },
			'end-others': { may: 'signed-in' },
			password: { may: 'signed-in' }
		}
	},
	'/(auth)/first-school/[token]': { read: 'anyone', actions: { default: { may: 'anyone' } } },
	'/(auth)/home': { read: 'signed-in' },
	'/(auth)/invitation/[token]': { read: 'anyone', actions: { default: { may: 'anyone' } } },
	'/(auth)/joining/[token]': { read: 'anyone', actions: { default: { may: 'anyone' } } },
	'/(auth)/password/[token]': { read: 'anyone', actions: { default: { may: 'anyone' } } },
	'/(auth)/password/forgotten': { read: 'anyone', actions: { default: { may: 'anyone' } } },
	'/(auth)/sign-in': {
		read: 'anyone',
		actions: {
			'sign-in': { may: 'anyone' },
			'sign-out': { may: 'anyone' },
			default: { may: 'anyone' }
		}
	},
	'/(auth)/sign-in/link': { read: 'anyone', actions: { default: { may: 'anyone' } } },
	'/(auth)/sign-in/link/[token]': { read: 'anyone', actions: { default: { may: 'anyone' } } },
	'/healthz': { read: 'anyone' },
	'/readyz': { read: 'anyone' },
	'/api/v1/openapi.json': { read: 'anyone' },
	'/api/v1/stripe/webhook': {},

	'/s/[school]/(student)/bench': { read: ['student', 'student2'] },
	'/s/[school]/(student)/certificates': { read: ['student', 'student2'] },
	'/s/[school]/(student)/certificates/[certificate]/pdf': { read: ['verifier', 'office'] },
	'/s/[school]/(student)/lessons/[enrolment]/[step]': { read: [own], actions: { finish: student } },
	'/s/[school]/(student)/quizzes/[enrolment]/[step]': { read: [own], actions: { begin: student } },
	'/s/[school]/(student)/sittings/[sitting]': {
		read: ['student2'],
		actions: { 'hand-in': { may: ['student2'] } }
	},
	'/s/[school]/(student)/sittings/[sitting]/result': { read: ['student2'] },
	'/s/[school]/(student)/job-sheets/[enrolment]/[step]': {
		read: [own],
		actions: { open: student }
	},
	'/s/[school]/(student)/job-sheets/[enrolment]/[step]/[submission]': {
		read: ['student2', ...instructors, 'verifier'],
		actions: { 'hand-in': { may: ['student2'], form: { baseVersion: '0' } } }
	},
	'/s/[school]/(student)/job-sheets/[enrolment]/[step]/[submission]/tag': {
		read: ['student2', ...instructors, 'verifier']
	},
	'/s/[school]/(instructor)/marking': { read: instructors },
	'/s/[school]/(instructor)/marking/[submission]': {
		read: instructors,
		actions: {
			take: byInstructors(),
			'put-back': byInstructors(),
			sign: { may: [], form: { 'rows[0].criterion': 'order', 'rows[0].level': '1' } }
		}
	},
	'/s/[school]/(instructor)/progress': { read: staff },
	'/s/[school]/(instructor)/progress/[cohort]': { read: staff },
	'/s/[school]/(instructor)/bench-hours/[enrolment]': {
		read: instructors,
		actions: { default: byInstructors({ onDay: '2026-11-01', hours: '1', what: 'x' }) }
	},
	'/s/[school]/(verifier)/awards': { read: ['verifier'] },
	'/s/[school]/(verifier)/awards/[award]': {
		read: ['verifier'],
		actions: {
			decide: { may: ['verifier'], form: { decision: 'decline', reason: 'x' } },
			withdraw: { may: ['verifier'], form: { certificateId: ulid, reason: 'x' } }
		}
	},
	'/s/[school]/(office)/cohorts': {
		read: ['office'],
		actions: {
			create: office({
				title: 'x',
				courseKey: 'x',
				startsOn: '2026-01-01',
				endsOn: '2026-02-01',
				instructorId: 'x'
			}),
			take: office({ courseKey: 'reading-failed-engines' })
		}
	},
	'/s/[school]/(office)/cohorts/[cohort]': {
		read: ['office'],
		actions: {
			buy: office({ quantity: '1' }),
			record: office({ quantity: '1', method: 'bank-transfer', reference: 'x' }),
			plan: office({ list: 'A,a@b.example' }),
			apply: office({ list: 'A,a@b.example' }),
			'invite-again': office({ entryId: ulid }),
			'take-off': office({ entryId: ulid })
		}
	},
	'/s/[school]/(office)/mail': { read: ['office'] },
	'/s/[school]/(office)/ledger': { read: ['verifier', 'office'] },
	'/s/[school]/(office)/ledger/file': { read: ['verifier', 'office'] },
	'/s/[school]/(office)/people': {
		read: ['office'],
		actions: {
			roles: office({ personId: ulid, 'roles[]': 'admin' }),
			'extra-time': office({ personId: ulid, percent: '25', extraTimePercent: '25' }),
			invite: office({ name: 'x', email: 'x@y.example', 'roles[]': 'admin' }),
			'withdraw-invitation': office({ id: ulid }),
			'make-token': office({ name: 'x', 'scopes[]': 'progress' }),
			'withdraw-token': office({ id: ulid })
		}
	},
	'/s/[school]/data-sheets': {
		read: all,
		actions: {
			begin: byInstructors({ code: 'KT-900', title: 'x' }),
			'from-file': byInstructors({ text: 'dimensions: []' })
		}
	},
	'/s/[school]/data-sheets/[sheet]': { read: all },
	'/s/[school]/data-sheets/[sheet]/draft': {
		read: instructors,
		actions: {
			begin: byInstructors(),
			'read-file': byInstructors({ baseVersion: '1', text: 'dimensions: []' }),
			discard: byInstructors({ baseVersion: '1' })
		}
	},
	'/s/[school]/data-sheets/[sheet]/draft/publish': {
		read: [],
		actions: { default: byInstructors({ baseVersion: '1' }) }
	},
	'/s/[school]/data-sheets/[sheet]/file': { read: all },
	'/s/[school]/data-sheets/[sheet]/revisions': { read: staff },
	'/s/[school]/data-sheets/[sheet]/revisions/[revision]': { read: staff },
	'/s/[school]/files/[file]': { read: ['student2', ...instructors, 'verifier'] },

	'/api/v1/schools/[school]/cohorts': { read: [...instructors, 'office'] },
	'/api/v1/schools/[school]/cohorts/[cohort]/progress': { read: staff },
	'/api/v1/schools/[school]/cohorts/[cohort]/roster': {
		writes: { method: 'POST', may: ['office'], body: { list: 'A,a@b.example' } }
	},
	'/api/v1/schools/[school]/cohorts/[cohort]/roster/plan': {
		writes: { method: 'POST', may: ['office'], body: { list: 'A,a@b.example' } }
	},
	'/api/v1/schools/[school]/data-sheets/[sheet]/draft/operations': {
		writes: {
			method: 'POST',
			may: instructors,
			body: {
				baseVersion: 1,
				operations: [{ kind: 'set', section: 'head', row: 'head', field: 'title', value: 'x' }]
			}
		}
	},
	'/api/v1/schools/[school]/enrolments/[enrolment]/steps/[step]/watched': {
		writes: { method: 'POST', may: [own], body: { filmHash: 'x', positionS: 0, intervals: [] } }
	},
	'/api/v1/schools/[school]/marking': { read: instructors },
	'/api/v1/schools/[school]/sittings/[sitting]/open': {
		writes: { method: 'POST', may: ['student2'], body: {} }
	},
	'/api/v1/schools/[school]/sittings/[sitting]/responses': {
		writes: {
			method: 'POST',
			may: ['student2'],
			body: { questionId: ulid, epoch: 1, number: 1, response: {} }
		}
	},
	'/api/v1/schools/[school]/submissions/[submission]': {
		read: ['student2', ...instructors, 'verifier']
	},
	'/api/v1/schools/[school]/submissions/[submission]/operations': {
		writes: {
			method: 'POST',
			may: ['student2'],
			body: { baseVersion: 0, operations: [{ kind: 'note', key: 'x', words: 'x' }] }
		}
	},
	'/api/v1/schools/[school]/submissions/[submission]/photographs': {
		writes: { method: 'POST', may: ['student2'], body: {} }
	},
	'/api/v1/schools/[school]/submissions/[submission]/photographs/[photograph]': {
		writes: { method: 'DELETE', may: ['student2'], body: {} }
	}
};

const root = 'src/routes';
function routes(): { id: string; folder: string }[] {
	return readdirSync(root, { recursive: true, withFileTypes: true })
		.filter((one) => /^\+(page\.svelte|server\.ts)$/.test(one.name))
		.map((one) => one.parentPath)
		.filter((folder, index, all) => all.indexOf(folder) === index)
		.map((folder) => ({ folder, id: folder.slice(root.length) || '/' }));
}

/** The names of a page's form actions, read from its source. */
function actionsIn(folder: string): string[] {
	let text: string;
	try {
		text = readFileSync(join(folder, '+page.server.ts'), 'utf8');
	} catch {
		return [];
	}
	const block =
		/export const actions[^=]*=\s*\{([\s\S]*?)\n\};|export const actions[^=]*=\s*\{(.*)\};/.exec(
			text
		);
	const body = block?.[1] ?? block?.[2] ?? '';
	return [
		...body.matchAll(/(?:^|\n)\t?\s?'?([a-z-]+)'?:\s*(?:formAction|\(event|async|answerForm)/g)
	].map(([, name]) => name ?? '');
}

test('every route and every action stands in the table', () => {
	const found = routes();
	expect(found.map((one) => one.id).toSorted()).toEqual(Object.keys(table).toSorted());
	for (const { id, folder } of found) {
		if (id.startsWith('/(auth)/sign-in') && !id.includes('[')) continue;
		expect(actionsIn(folder).toSorted(), id).toEqual(
			Object.keys(table[id]?.actions ?? {}).toSorted()
		);
	}
});

type Names = Record<string, string>;
async function namesFor(dataDir: string): Promise<Names> {
	const first = async (statement: string) => {
		const [row] = await rowsOf<{ id: string }>(dataDir, statement);
		if (!row) throw new Error(`nothing for ${statement}`);
		return row.id;
	};
	const ofPerson = (email: string) =>
		`SELECT p.id FROM people p JOIN accounts a ON a.id = p.accountId JOIN schools s ON s.id = p.schoolId WHERE a.email = '${email}@averholm.example' AND s.slug = 'averholm'`;
	const second = `SELECT s.id FROM submissions s WHERE s.personId = (${ofPerson('student2')})`;
	return {
		school: 'averholm',
		enrolment: await first(`SELECT id FROM enrolments WHERE personId = (${ofPerson(own)})`),
		submission: await first(second),
		sitting: await first(`SELECT id FROM sittings WHERE personId = (${ofPerson('student2')})`),
		photograph: await first(`SELECT id FROM photographs WHERE submissionId IN (${second})`),
		file: await first(
			`SELECT smallFileId AS id FROM photographs WHERE submissionId IN (${second}) AND smallFileId IS NOT NULL`
		),
		certificate: await first('SELECT id FROM certificates WHERE withdrawnAt IS NULL'),
		award: await first("SELECT id FROM awards WHERE state = 'waiting'"),
		cohort: await first(
			"SELECT c.id FROM cohorts c JOIN schools s ON s.id = c.schoolId WHERE s.slug = 'averholm'"
		),
		sheet: 'av3-1150',
		revision: 'C',
		calculator: 'oil-clearance',
		code: 'RL-0000-0000-0000',
		token: 'a-token-that-was-never-given-out'
	};
}

function address(id: string, names: Names): string {
	const step = id.includes('quizzes')
		? 'torque-and-tagging-quiz'
		: id.includes('job-sheets')
			? 'strip-and-tag-sheet'
			: 'fasteners';
	return (
		id
			.replace(/\/\([^)]+\)/g, '')
			// An attempt's address names its own enrolment; that of the other student does not fit it.
			.replace(/\[([a-z]+)\]/g, (_, name: string) =>
				name === 'step' ? step : (names[name] ?? name)
			) || '/'
	);
}

test('each route and action answers each role of both schools as the table says', async ({
	site,
	openContext,
	stranger
}) => {
	test.setTimeout(300_000);
	const names = await test.step('wait for the photographs of the demo', async () => {
		let found: Names | undefined;
		await expect
			.poll(
				async () => (found = await namesFor(site.dataDir).catch(() => undefined)) !== undefined,
				{ timeout: 60_000 }
			)
			.toBe(true);
		return found as unknown as Names;
	});
	const [second] = await rowsOf<{ enrolmentId: string }>(
		site.dataDir,
		`SELECT enrolmentId FROM submissions WHERE id = '${names.submission}'`
	);
	const players = new Map<string, APIRequestContext>();
	players.set('anyone', (await stranger()).request);
	for (const school of ['averholm', 'korrig'])
		for (const player of cast) {
			const page = await (await openContext()).newPage();
			await signIn(page, `${player}@${school}.example`, demoPassword);
			players.set(`${player}@${school}`, page.request);
		}

	const wrong: string[] = [];
	const expectStatus = (what: string, got: number, fits: boolean) => {
		if (!fits) wrong.push(`${what}: ${got}`);
	};
	for (const [id, line] of Object.entries(table)) {
		const here =
			id.includes('[submission]') && second ? { ...names, enrolment: second.enrolmentId } : names;
		const url = address(id, here);
		for (const [who, request] of players) {
			const [player = '', school = ''] = who.split('@');
			const isIn = (may: Player[] | 'anyone' | 'signed-in') =>
				may === 'anyone' ||
				(may === 'signed-in'
					? who !== 'anyone'
					: school === 'averholm' && may.includes(player as Player));
			const refused = (status: number, location = '') =>
				who === 'anyone'
					? status === 401 || (status >= 302 && status <= 307 && location.includes('/sign-in'))
					: status === 404;
			if (line.read) {
				const got = await request.get(url, { maxRedirects: 0 });
				const allowed = isIn(line.read);
				// A page may lead on (an ended sitting, the first page of a role), never to the sign-in.
				const well = got.status() < 400 && !(got.headers().location ?? '').includes('/sign-in');
				const gone = line.read !== 'anyone' && got.status() === 410;
				const result = id.endsWith('/result') || id.endsWith('[sitting]');
				const nothingThere = line.read === 'anyone' && got.status() === 404;
				expectStatus(
					`GET ${id} as ${who}`,
					got.status(),
					allowed
						? well || gone || nothingThere || (result && well)
						: refused(got.status(), got.headers().location)
				);
			}
			if (line.writes && !isIn(line.writes.may)) {
				const query = id.endsWith('/photographs') ? `?shot=x&requestKey=${ulid}` : '';
				const got = await request.fetch(url + query, {
					method: line.writes.method,
					headers: {
						origin: site.origin,
						'content-type': query ? 'image/jpeg' : 'application/json'
					},
					data: query ? await photograph('nobody') : { requestKey: ulid, ...line.writes.body },
					maxRedirects: 0
				});
				expectStatus(`${line.writes.method} ${id} as ${who}`, got.status(), refused(got.status()));
			}
			for (const [action, { may, form = {} }] of Object.entries(line.actions ?? {})) {
				if (isIn(may)) continue;
				const query = action === 'default' ? '' : `?/${action}`;
				const got = await request.post(url + query, {
					headers: {
						origin: site.origin,
						accept: 'application/json',
						'x-sveltekit-action': 'true'
					},
					form,
					maxRedirects: 0
				});
				const answer = (await got.json().catch(() => ({}))) as {
					type?: string;
					status?: number;
					location?: string;
				};
				const no =
					(answer.type === 'failure' && [401, 404].includes(answer.status ?? 0)) ||
					(answer.type === 'redirect' && (answer.location ?? '').includes('/sign-in')) ||
					(answer.type === 'error' && refused(got.status()));
				expectStatus(
					`POST ${id} ?/${action} as ${who} → ${JSON.stringify(answer).slice(0, 90)}`,
					got.status(),
					no
				);
			}
		}
	}
	expect(wrong).toEqual([]);
});

test('the API demands JSON, its own origin, and problem details come back', async ({
	as,
	site
}) => {
	const page = await as('office@averholm.example');
	const path = '/api/v1/schools/averholm/cohorts';
	const [cohort] = await rowsOf<{ id: string }>(site.dataDir, 'SELECT id FROM cohorts LIMIT 1');
	const plan = `${path}/${cohort?.id}/roster/plan`;
	const body = { requestKey: ulid, list: 'A,a@b.example' };
	const foreign = await page.request.post(plan, {
		headers: { origin: 'https://elsewhere.example' },
		data: body
	});
	expect([400, 403]).toContain(foreign.status());
	const text = await page.request.post(plan, {
		headers: { origin: site.origin, 'content-type': 'application/x-www-form-urlencoded' },
		data: 'list=x'
	});
	expect(text.status()).toBe(400);
	const keyless = await page.request.post(plan, {
		headers: { origin: site.origin },
		data: { list: 'x' }
	});
	expect(keyless.headers()['content-type']).toContain('application/problem+json');
	const described = (await (await page.request.get('/api/v1/openapi.json')).json()) as {
		openapi: string;
		paths: object;
	};
	expect(described.openapi).toBe('3.1.0');
	const served = routes()
		.map((one) => one.id)
		.filter((id) => id.startsWith('/api/v1/schools'))
		.map((id) => id.replace(/\[(\w+)\]/g, '{$1}'));
	expect(Object.keys(described.paths).toSorted()).toEqual(served.toSorted());
});
