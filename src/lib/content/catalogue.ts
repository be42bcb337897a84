import { parse } from 'yaml';
import { courseSchema, type Course } from '$lib/domain/courses/schema';
import { dataSheetSchema, type DataSheet } from '$lib/domain/data-sheets/schema';
import { keysOf } from '$lib/domain/data-sheets/value-of';
import { jobSheetSchema, type JobSheet } from '$lib/domain/job-sheets/schema';
import { questionFileSchema, questionsOf, type Question } from '$lib/domain/questions/schema';
import { quizSchema, type Quiz } from '$lib/domain/quizzes/schema';
import { ContentFault, parsed } from './fault';
import { files } from './files';
import { readLessons, type Lesson } from './lessons';

export type CatalogueCourse = {
	course: Course;
	lessons: Lesson[];
	questions: Question[];
	quizzes: Quiz[];
	jobSheets: JobSheet[];
	sheet: DataSheet;
};
export type Catalogue = {
	courses: CatalogueCourse[];
	engines: DataSheet[];
	courseByKey: (key: string) => CatalogueCourse | undefined;
	lessonByKey: (key: string) => Lesson | undefined;
};

let read: Catalogue | undefined;

/** Everything that the operator's repository teaches, read once. @throws ContentFault for the first fault */
export function catalogue(): Catalogue {
	return (read ??= readCatalogue());
}

function readCatalogue(): Catalogue {
	const engines = Object.entries(files.engines).map(([file, text]) =>
		parsed(dataSheetSchema, file, parse(text))
	);
	const lessons = readLessons();
	const courses = Object.entries(files.courses).map(([file, text]) =>
		readCourse(file, parsed(courseSchema, file, parse(text)), engines, lessons)
	);
	return {
		courses,
		engines,
		courseByKey: (key) => courses.find((one) => one.course.key === key),
		lessonByKey: (key) => lessons.find((one) => one.key === key)
	};
}

function readCourse(
	file: string,
	course: Course,
	engines: DataSheet[],
	allLessons: Lesson[]
): CatalogueCourse {
	const folder = file.replace(/course\.yaml$/, '');
	const own = <T>(of: Record<string, string>, read: (file: string, value: unknown) => T[]): T[] =>
		Object.entries(of)
			.filter(([name]) => name.startsWith(folder))
			.flatMap(([name, text]) => read(name, parse(text)));
	const sheet = engines.find((one) => one.key === course.engine);
	if (!sheet) throw new ContentFault(file, `there is no data sheet ${course.engine}`);
	const found: CatalogueCourse = {
		course,
		sheet,
		lessons: allLessons.filter((one) => one.courseKey === course.key),
		questions: own(files.questions, (name, value) =>
			questionsOf(parsed(questionFileSchema, name, value))
		),
		quizzes: own(files.quizzes, (name, value) => [parsed(quizSchema, name, value)]),
		jobSheets: own(files.jobSheets, (name, value) => [parsed(jobSheetSchema, name, value)])
	};
	checkReferences(file, found);
	return found;
}

/** Every name that one part of a course says of another must be there. */
function checkReferences(file: string, found: CatalogueCourse): void {
	const { course, lessons, questions, quizzes, jobSheets, sheet } = found;
	const refs = {
		lesson: lessons.map((one) => one.key),
		quiz: quizzes.map((one) => one.key),
		'job-sheet': jobSheets.map((one) => one.key)
	};
	for (const step of course.steps)
		if (!refs[step.kind].includes(step.ref))
			throw new ContentFault(file, `step ${step.key}: there is no ${step.kind} ${step.ref}`);
	const keys = keysOf(sheet);
	for (const lesson of lessons)
		for (const { key, line } of lesson.values)
			if (!keys.has(key))
				throw new ContentFault(lesson.file, `the data sheet ${sheet.code} has no ${key}`, line);
	const outcomes = new Set(course.outcomes.map((one) => one.key));
	for (const { key, outcome, readAgain } of questions) {
		if (!outcomes.has(outcome))
			throw new ContentFault(file, `question ${key}: there is no outcome ${outcome}`);
		const lesson = lessons.find((one) => one.key === readAgain.lesson);
		if (!lesson) throw new ContentFault(file, `question ${key}: no lesson ${readAgain.lesson}`);
		if (!lesson.text.includes(`id="${readAgain.anchor}"`))
			throw new ContentFault(lesson.file, `question ${key} sends people to #${readAgain.anchor}`);
	}
	for (const jobSheet of jobSheets) {
		for (const one of jobSheet.scheme.criteria)
			if (!outcomes.has(one.outcome))
				throw new ContentFault(file, `job sheet ${jobSheet.key}: no outcome ${one.outcome}`);
		for (const key of [
			...jobSheet.grids.map((one) => one.dimension),
			...jobSheet.results.map((one) => one.limit)
		])
			if (!keys.has(key))
				throw new ContentFault(file, `job sheet ${jobSheet.key}: the data sheet has no ${key}`);
	}
}
