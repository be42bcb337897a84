import { afterEach, beforeEach, expect, it } from 'vitest';
import { awards, certificates, ledgerEntries, mails } from '$lib/server/data/models';
import { find, select } from '$lib/server/data/rows';
import {
	checkCertificate,
	listOwnCertificates,
	printCertificate,
	withdrawCertificate
} from '$lib/server/services/awards/certificates';
import { decideAward } from '$lib/server/services/awards/decide-award';
import { callerAs } from '../../support/house';
import { almostFinished, type Course } from './finished-course';

let course: Course;
let certificateId: string;
let code: string;
beforeEach(async () => {
	course = await almostFinished();
	await course.enterHours(3);
	const [award] = await select(course.house.look, awards);
	const caller = await course.verifier.caller();
	await decideAward(caller, { awardId: award?.id, decision: 'award' });
	const [made] = await select(course.house.look, certificates);
	if (!made) throw new Error('no certificate was made');
	({ id: certificateId, code } = made);
});
afterEach(() => course.house.close());

const check = (typed: string) => checkCertificate(callerAs(course.house), { code: typed });
const withdraw = async (reason: string, who = course.verifier) =>
	withdrawCertificate(await who.caller(), { certificateId, reason });
const own = async () => (await listOwnCertificates(await course.student.caller(), {})).certificates;

it('anyone may check it, however the code is typed', async () => {
	const typed = [code, code.toLowerCase(), code.replaceAll('-', ' '), ` ${code.slice(3)} `];
	for (const one of typed)
		expect(await check(one)).toMatchObject({
			found: true,
			withdrawn: null,
			schoolSlug: 'averholm',
			face: {
				personName: 'Ilka Brandt',
				tasks: [{ engine: 'AV4-2200D', how: 'alone' }],
				notAssessed: ['Teardown of an engine', 'Failure causes']
			}
		});
});

it('a slip in the code is told from a code that nobody has', async () => {
	const last = code.at(-1) === '0' ? '1' : '0';
	expect(await check(code.slice(0, -1) + last)).toMatchObject({ because: 'no-such-code' });
	expect(await check('RL-0000-0000-0000')).toEqual({
		found: false,
		because: 'unknown',
		typed: 'RL-0000-0000-0000'
	});
});

it('its owner has it with a code to show, and no other student or instructor can print it', async () => {
	const [mine] = await own();
	expect(mine?.checkQr).toContain(`the page that checks ${code}`);
	const { pdf, fileName } = await printCertificate(await course.student.caller(), {
		certificateId
	});
	expect(Buffer.from(pdf.subarray(0, 5)).toString()).toBe('%PDF-');
	expect(fileName).toBe(`${code}.pdf`);
	const others = [
		await course.house.addPerson(course.school, 'Teo Aas', ['student']),
		await course.house.addPerson(course.school, 'Jens Moe', ['instructor'])
	];
	for (const one of others)
		await expect(printCertificate(await one.caller(), { certificateId })).rejects.toMatchObject({
			code: 'absent'
		});
});

it('withdrawn, it says so wherever it is looked at, with the reason and the time', async () => {
	course.house.passMs(60_000);
	const reason = 'The readings were another student’s. '.repeat(12).trim();
	await withdraw(reason);
	const at = course.house.now().toISOString();
	expect(await check(code)).toMatchObject({ found: true, withdrawn: { at, reason } });
	expect((await own())[0]).toMatchObject({ withdrawnReason: reason, checkQr: null });
	const print = printCertificate(await course.student.caller(), { certificateId });
	await expect(print).rejects.toMatchObject({ code: 'closed' });
	const [letter] = await select(course.house.look, mails, { kind: 'certificate-withdrawn' });
	expect(letter?.recipient).toBe(course.student.email);
	expect(letter?.payload).toMatchObject({ code, reason });
	const line = await find(course.house.look, ledgerEntries, { kind: 'certificate-withdrawn' });
	expect(line).toMatchObject({ actorId: course.verifier.personId, subject: certificateId });
});

it('is withdrawn once, and not without a reason', async () => {
	await expect(withdraw(' ')).rejects.toMatchObject({ code: 'input' });
	await withdraw('First.');
	await expect(withdraw('Second.')).rejects.toMatchObject({
		fields: { reason: ['This certificate was withdrawn before.'] }
	});
	expect(await check(code)).toMatchObject({ withdrawn: { reason: 'First.' } });
	expect(await select(course.house.look, mails, { kind: 'certificate-withdrawn' })).toHaveLength(1);
});

it('is not withdrawn by who marked the work, the office or the student', async () => {
	for (const who of [course.marker, course.admin, course.student])
		await expect(withdraw('No.', who)).rejects.toMatchObject({ code: 'absent' });
	expect(await check(code)).toMatchObject({ withdrawn: null });
});
