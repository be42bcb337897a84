import { readdirSync, readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { parse } from 'yaml';
import { questionFileSchema } from '$lib/domain/questions/schema';

const folder = 'tests/cases/questions/yaml';

for (const name of readdirSync(folder))
	it(`${name} is a question file`, () => {
		const read = questionFileSchema.safeParse(parse(readFileSync(`${folder}/${name}`, 'utf8')));
		expect(read.error?.issues ?? []).toEqual([]);
	});
