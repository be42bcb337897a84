/** A count with its words: `counted(1, 'place is', 'places are')` gives "1 place is". */
export function counted(count: number, one: string, many: string): string {
	return `${count} ${count === 1 ? one : many}`;
}
