import { afterEach, beforeEach, expect, vi } from 'vitest';

/** An unexpected warning or error on the console is a defect: a test that wants one spies on it itself. */
const loud = ['error', 'warn'] as const;

beforeEach(() => {
	for (const level of loud) vi.spyOn(console, level);
});

afterEach(() => {
	const said = loud.flatMap((level) =>
		vi.isMockFunction(console[level]) ? vi.mocked(console[level]).mock.calls : []
	);
	vi.restoreAllMocks();
	expect(said, 'console output that no test expected').toEqual([]);
});
