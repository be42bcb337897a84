/** Whether each is a line that its scale has: whole, from 0 to the last. */
export function areLines(...scales: (readonly [line: number, last: number])[]): boolean {
	return scales.every(([line, last]) => Number.isInteger(line) && line >= 0 && line <= last);
}
