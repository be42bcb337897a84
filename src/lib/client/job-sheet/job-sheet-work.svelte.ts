import {
	applyOperation,
	type Operation,
	type SubmissionBody
} from '$lib/domain/job-sheets/submission';
import { BatchedWork } from '../queue/batched-work.svelte';

type Shapes = Record<string, { rows: number; columns: number }>;

/** An open job sheet in one browser. */
export class JobSheetWork extends BatchedWork<SubmissionBody, Operation> {
	constructor(
		path: string,
		storageKey: string,
		shapes: Shapes,
		server: { body: SubmissionBody; version: number }
	) {
		super(
			{ path, storageKey, apply: (body, operation) => applyOperation(body, operation, shapes) },
			server
		);
	}
}
