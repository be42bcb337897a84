import { z } from 'zod';
import { readCertificateCode } from '$lib/domain/certificates/code';
import { checkAddress } from '$lib/domain/certificates/face';
import { inputProblem, Problem } from '$lib/domain/problem';
import {
	certificateByCode,
	findAward,
	findCertificate,
	markersOf
} from '../../data/queries/awards';
import { findPerson, schoolById } from '../../data/queries/schools';
import { qrSvg } from '../../gateways/qr/qr';
import { accounts, certificates } from '../../data/models';
import { find, select, update } from '../../data/rows';
import { acrossSchools } from '../../data/scope';
import { readCase, writeCase } from '../use-case';

/** Anyone, without an account: whose it is, for what, by whom, and whether it stands. */
export const checkCertificate = readCase({
	name: 'check-certificate',
	action: 'certificate:check',
	where: 'common',
	input: z.object({ code: z.string().trim().max(60) }),
	subject: () => Promise.resolve({}),
	async run({ scope, input }) {
		const code = readCertificateCode(input.code);
		if (!code)
			return { found: false as const, because: 'no-such-code' as const, typed: input.code };
		const certificate = await certificateByCode(scope, code);
		if (!certificate) return { found: false as const, because: 'unknown' as const, typed: code };
		const school = await schoolById(scope, certificate.schoolId);
		return {
			found: true as const,
			face: certificate.face,
			issuedAt: certificate.issuedAt,
			schoolSlug: school?.slug ?? '',
			withdrawn: certificate.withdrawnAt
				? { at: certificate.withdrawnAt, reason: certificate.withdrawnReason ?? '' }
				: null
		};
	}
});

export const listOwnCertificates = readCase({
	name: 'list-own-certificates',
	action: 'bench:read',
	input: z.object({}).default({}),
	subject: ({ scope, me }) => Promise.resolve({ schoolId: scope.schoolId, ownerId: me }),
	async run({ scope, house, me }) {
		const own = await select(
			scope,
			certificates,
			{ personId: me },
			{ order: [['issuedAt', 'desc']] }
		);
		return {
			certificates: own.map(({ id, code, face, issuedAt, withdrawnAt, withdrawnReason }) => ({
				id,
				code,
				face,
				issuedAt,
				withdrawnAt,
				withdrawnReason,
				/** Held to somebody's camera; a withdrawn one is nothing to show around. */
				checkQr: withdrawnAt
					? null
					: qrSvg(checkAddress(house.config.ORIGIN, code), `QR code: the page that checks ${code}`)
			}))
		};
	}
});

/** The PDF is printed from the frozen face each time: the same bytes for the same certificate. */
export const printCertificate = readCase({
	name: 'print-certificate',
	action: 'certificate:read-own',
	input: z.object({ certificateId: z.string() }),
	async subject({ scope, input }) {
		const certificate = await findCertificate(scope, input.certificateId);
		return certificate && { schoolId: scope.schoolId, ownerId: certificate.personId, certificate };
	},
	async run({ house, subject: { certificate } }) {
		if (certificate.withdrawnAt)
			throw new Problem('closed', 'This certificate was withdrawn: {reason}', {
				reason: certificate.withdrawnReason ?? ''
			});
		const pdf = await house.gateways.pdf.printCertificate({
			face: certificate.face,
			checkAddress: checkAddress(house.config.ORIGIN, certificate.code)
		});
		return { pdf, fileName: `${certificate.code}.pdf` };
	}
});

/** Takes a certificate back. It shows wherever the certificate is checked, at once. */
export const withdrawCertificate = writeCase({
	name: 'withdraw-certificate',
	action: 'certificate:withdraw',
	input: z.object({
		certificateId: z.string(),
		reason: z.string().trim().min(1, 'Say why: whoever checks the certificate reads it.').max(600)
	}),
	async subject({ scope, input }) {
		const certificate = await findCertificate(scope, input.certificateId);
		const award = certificate && (await findAward(scope, certificate.awardId));
		if (!certificate || !award) return undefined;
		const markerIds = await markersOf(scope, award.enrolmentId);
		return { schoolId: scope.schoolId, ownerId: certificate.personId, markerIds, certificate };
	},
	async run({ scope, subject: { certificate }, input, me, at, record, mail }) {
		const changed = await update(
			scope,
			certificates,
			{ id: certificate.id, withdrawnAt: null },
			{ withdrawnAt: at.toISOString(), withdrawnBy: me, withdrawnReason: input.reason }
		);
		if (changed !== 1) throw inputProblem({ reason: ['This certificate was withdrawn before.'] });
		await record({
			kind: 'certificate-withdrawn',
			subject: certificate.id,
			data: { code: certificate.code, reason: input.reason }
		});
		const person = await findPerson(scope, certificate.personId);
		const account =
			person && (await find(acrossSchools(scope), accounts, { id: person.accountId }));
		if (account) {
			const { code, face } = certificate;
			const about = { name: face.personName, courseTitle: face.course.title, code };
			const payload = { ...about, reason: input.reason };
			await mail({ kind: 'certificate-withdrawn', to: account.email, payload });
		}
		return { withdrawn: certificate.code };
	}
});
