import { limit } from './faces';

type Examples = { buildLeast: string; buildMost: string; runMost: string };

/** Limits of a clearance, a gap or a float: two to build, one to run again. */
export function limitFields(of: string, { buildLeast, buildMost, runMost }: Examples) {
	return {
		buildLeast: limit(`Least ${of}, to build`, buildLeast),
		buildMost: limit(`Most ${of}, to build`, buildMost),
		runMost: limit(`Most ${of}, to run again`, runMost)
	};
}
