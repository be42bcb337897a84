import type { Task } from './evidence';

/** 750 minutes: "12 h 30 min". */
export function hoursWords(minutes: number): string {
	const [hours, rest] = [Math.floor(minutes / 60), minutes % 60];
	if (hours === 0) return `${rest} min`;
	return rest === 0 ? `${hours} h` : `${hours} h ${rest} min`;
}

/** "alone", "in a pair (took the pin readings)", "with help (turned the crankshaft)". */
export function howWords(task: Pick<Task, 'how' | 'share'>): string {
	const how = { alone: 'alone', pair: 'in a pair', helped: 'with help' }[task.how];
	return task.share ? `${how} (${task.share})` : how;
}

/** "4 March 2026", the same for every reader and every time zone: a day is a day. */
export function dayWords(on: string): string {
	return new Intl.DateTimeFormat('en-GB', {
		day: 'numeric',
		month: 'long',
		year: 'numeric',
		timeZone: 'UTC'
	}).format(new Date(`${on}T00:00:00Z`));
}
