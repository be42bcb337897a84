import { anyone } from '$lib/domain/actor';
import { demoPassword } from '$lib/domain/accounts/demo-password';
import { mails } from '../data/models';
import { select } from '../data/rows';
import { commonScope } from '../data/scope';
import { acceptInvitation } from '../services/cohorts/accept-invitation';
import { recordPayment } from '../services/cohorts/buy-places';
import { createCohort } from '../services/cohorts/create-cohort';
import { applyCohortRoster } from '../services/cohorts/plan-roster';
import type { Stage } from './stage';

type Wanted = {
	schoolId: string;
	office: string;
	instructor: string;
	title: string;
	courseKey: string;
	fromDay: number;
	toDay: number;
	places: number;
	students: readonly { email: string; name: string; comes: boolean }[];
};

/** A cohort from its creation to the students who took their place by the mailed link. */
export async function enrolCohort(stage: Stage, wanted: Wanted): Promise<string> {
	const { schoolId, title } = wanted;
	const office = await stage.actor(wanted.office);
	const as = (act: string) => stage.as(office, schoolId, `${title}/${act}`);
	stage.at(wanted.fromDay - 12, 10);
	const { cohortId } = await createCohort(as('create'), {
		title,
		courseKey: wanted.courseKey,
		startsOn: stage.day(wanted.fromDay),
		endsOn: stage.day(wanted.toDay),
		instructorId: stage.named(`person/${wanted.instructor}`)
	});
	stage.at(wanted.fromDay - 11, 10);
	await recordPayment(as('pay'), {
		cohortId,
		quantity: wanted.places,
		method: 'bank-transfer',
		reference: `BT-${stage.day(wanted.fromDay - 11).replaceAll('-', '')}-${wanted.places}`
	});
	stage.at(wanted.fromDay - 10, 10);
	const list = wanted.students.map((one, index) => `"${one.name}",${one.email},AV-${1041 + index}`);
	await applyCohortRoster(as('roster'), { cohortId, list: list.join('\n') });
	stage.at(wanted.fromDay - 8, 18);
	for (const one of wanted.students) if (one.comes) await takePlace(stage, schoolId, one.email);
	return cohortId;
}

/** Follows the link of the invitation, as a new person does. */
async function takePlace(stage: Stage, schoolId: string, email: string): Promise<void> {
	const { house } = stage;
	const scope = commonScope(house.database, null);
	const sent = await select(scope, mails, { recipient: email, kind: 'invitation', schoolId });
	const sealed = sent.at(-1)?.sealed;
	const id = sent.at(-1)?.id;
	if (!sealed || !id) return;
	const { link = '' } = JSON.parse(house.gateways.signing.open(sealed, id)) as { link?: string };
	const token = link.split('/').at(-1);
	const caller = { house, actor: anyone, schoolId: undefined };
	await acceptInvitation(caller, { token, password: demoPassword }).catch((error: unknown) => {
		// Played before: the link is used and its owner enrolled.
		house.log.debug({ err: error, email }, 'demo: invitation');
	});
}
