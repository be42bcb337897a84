import type { Course } from '../courses/schema';
import type { Question } from '../questions/schema';

/**
 * The questions that a course's quizzes may draw. A school's drawer holds those of all its
 * courses: what this course does not teach is left out, and so is what another engine's data
 * sheet would have to answer, since a sitting is worked on one sheet.
 */
export function poolFor<Q extends Pick<Question, 'outcome' | 'sheet'>>(
	course: Pick<Course, 'engine' | 'outcomes'>,
	questions: readonly Q[]
): Q[] {
	return questions.filter(
		({ outcome, sheet = course.engine }) =>
			sheet === course.engine && course.outcomes.some((one) => one.key === outcome)
	);
}
