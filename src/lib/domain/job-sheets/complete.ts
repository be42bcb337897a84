import type { JobSheet } from './schema';
import type { SubmissionBody } from './submission';

/** What is still missing before a job sheet can be handed in; empty when nothing is. */
export function missingFrom(
	jobSheet: JobSheet,
	body: SubmissionBody,
	photographs: readonly { shotKey: string; state: string }[]
): string[] {
	const has = (shot: string) =>
		photographs.some((one) => one.shotKey === shot && one.state !== 'refused');
	const missing = jobSheet.shots
		.filter((one) => one.required && !has(one.key))
		.map((one) => `Photograph: ${one.title}`);
	for (const grid of jobSheet.grids) {
		const wanted = grid.rows.length * grid.columns.length;
		const taken = (body.readings[grid.key] ?? []).flat().filter((one) => one !== null).length;
		if (taken < wanted)
			missing.push(`Readings: ${grid.title}, ${wanted - taken} of ${wanted} to take`);
	}
	for (const note of jobSheet.notes)
		if (!body.notes[note.key]?.trim()) missing.push(`Words: ${note.title}`);
	if (body.findings.length < jobSheet.findingsAtLeast)
		missing.push(
			`Findings: pin at least ${jobSheet.findingsAtLeast} in a photograph (${body.findings.length} so far)`
		);
	if (!body.argument.rootCause || !body.argument.chain)
		missing.push(`${jobSheet.argument.title}: name the cause and argue to it`);
	if (!body.help.alone && !body.help.words) missing.push('Say who helped you, and with what');
	return missing;
}
