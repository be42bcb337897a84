import type { Actor } from '$lib/domain/actor';
import { finishLesson, openLesson, watchFilm } from '../services/learning/watch-film';
import { readLesson } from '../services/learning/read-lesson';
import type { Stage } from './stage';

type Where = { schoolId: string; enrolmentId: string; stepKey: string };

/** Opens a lesson, watches its film, the whole of it or a part, and says that it is read. */
export async function playLesson(stage: Stage, who: Actor, where: Where, finished: boolean) {
	const { schoolId, ...at } = where;
	const act = (name: string) => stage.as(who, schoolId, `${at.enrolmentId}/${at.stepKey}/${name}`);
	await openLesson(act('open'), at);
	const { film } = await readLesson(act('read'), at);
	if (film) {
		const to = finished ? film.seconds : film.seconds * 0.4;
		await watchFilm(act('watch'), {
			...at,
			filmHash: film.hash,
			positionS: to,
			intervals: finished
				? [[0, to]]
				: [
						[0, to / 2],
						[to * 0.7, to]
					]
		});
	}
	if (finished) await finishLesson(act('finish'), at);
}
