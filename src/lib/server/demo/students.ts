/** How far a student of the demo has come. Each step may go well, or be left as it stands. */
export type Plan = {
	email: string;
	name: string;
	/** Steps done, in the course's order. */
	done: number;
	/** What the step after that looks like. */
	then: 'nothing' | 'begun' | 'waiting' | 'sent-back' | 'award-waiting' | 'awarded' | 'withdrawn';
	benchHours: number;
	comes?: boolean;
};

/** A dozen students in every state, so that no page is empty. */
export const averholmStudents: readonly Plan[] = [
	{
		email: 'student@averholm.example',
		name: 'Idris Vantongeren',
		done: 1,
		then: 'begun',
		benchHours: 2
	},
	{
		email: 'student2@averholm.example',
		name: 'Solveig Amadi',
		done: 3,
		then: 'waiting',
		benchHours: 6.5
	},
	{
		email: 'tomasz@averholm.example',
		name: 'Tomasz Okkonen',
		done: 3,
		then: 'sent-back',
		benchHours: 7
	},
	{
		email: 'wren@averholm.example',
		name: 'Wren Castellane',
		done: 7,
		then: 'waiting',
		benchHours: 11
	},
	{ email: 'farida@averholm.example', name: 'Farida Holm', done: 3, then: 'begun', benchHours: 3 },
	{
		email: 'jonas@averholm.example',
		name: 'Jonas Pereyra',
		done: 5,
		then: 'nothing',
		benchHours: 8
	},
	{
		email: 'lwazi@averholm.example',
		name: 'Lwazi Brandt',
		done: 6,
		then: 'begun',
		benchHours: 9.5
	},
	{
		email: 'edda@averholm.example',
		name: 'Edda Moreau',
		done: 8,
		then: 'award-waiting',
		benchHours: 13
	},
	{ email: 'piotr@averholm.example', name: 'Piotr Nakai', done: 0, then: 'nothing', benchHours: 0 },
	{
		email: 'ines@averholm.example',
		name: 'Ines Gallowan',
		done: 8,
		then: 'awarded',
		benchHours: 14
	},
	{
		email: 'odd@averholm.example',
		name: 'Odd Ferreira',
		done: 8,
		then: 'withdrawn',
		benchHours: 12.5
	},
	{ email: 'sana@averholm.example', name: 'Sana Whitlock', done: 4, then: 'begun', benchHours: 6 },
	{
		email: 'milo@averholm.example',
		name: 'Milo Achterberg',
		done: 0,
		then: 'nothing',
		benchHours: 0,
		comes: false
	}
];

export const korrigStudents: readonly Plan[] = [
	{ email: 'student@korrig.example', name: 'Nia Torvald', done: 1, then: 'nothing', benchHours: 1 },
	{
		email: 'student2@korrig.example',
		name: 'Emre Salvesen',
		done: 2,
		then: 'waiting',
		benchHours: 2.5
	}
];
