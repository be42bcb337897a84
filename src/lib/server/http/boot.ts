import { join } from 'node:path';
import { catalogue } from '$lib/content/catalogue';
import { readEnvironment } from '../config/env';
import { openDatabase } from '../data/database';
import { migrate } from '../data/migrations';
import { writesDone } from '../data/transaction';
import { makeImages } from '../gateways/images';
import { makeMailer } from '../gateways/mail';
import { makePdfPrinter } from '../gateways/pdf';
import { openSigning } from '../gateways/signing';
import { openDiskStorage } from '../gateways/storage';
import { makeTill } from '../gateways/stripe';
import { makeLog } from '../log/log';
import { bringContentUpToDate } from '../services/courses/take-course';
import { firstSchoolLink } from '../services/accounts/first-school';
import type { House } from '../services/house';
import { seedDemo } from '../demo/seed-demo';
import { startWorker, type Worker } from '../worker/loop';

let built: House | undefined;
let worker: Worker | undefined;

/** @throws Error before the start has finished: no request is served from half a house */
export function house(): House {
	if (!built) throw new Error('the house is not open yet');
	return built;
}

/** Opens everything in order: environment, keys, database, content, demo, worker. */
export async function startHouse(): Promise<void> {
	const config = readEnvironment();
	const log = makeLog(config.LOG_LEVEL);
	const database = openDatabase(join(config.DATA_DIR, 'ringland.sqlite'));
	const applied = await migrate(database);
	if (applied.length > 0) log.info({ applied }, 'database brought up to date');
	const here: House = {
		config,
		log,
		database,
		catalogue: await catalogue(),
		gateways: {
			images: makeImages(),
			mailer: makeMailer({ smtpUrl: config.SMTP_URL ?? 'smtp://127.0.0.1:25' }),
			pdf: makePdfPrinter(),
			signing: await openSigning(config.DATA_DIR),
			storage: await openDiskStorage(config.DATA_DIR),
			till: makeTill({
				secretKey: config.STRIPE_SECRET_KEY ?? 'sk_test_none',
				webhookSecret: config.STRIPE_WEBHOOK_SECRET ?? 'whsec_none',
				apiBase: config.STRIPE_API_BASE
			})
		},
		now: () => new Date(),
		chance: (bytes) => crypto.getRandomValues(new Uint8Array(bytes))
	};
	await bringContentUpToDate(here);
	if (config.DEMO === 'on') await seedDemo(here);
	else {
		const link = await firstSchoolLink(here);
		if (link) console.info(`Make the first school: ${link}`);
	}
	built = here;
	if (config.WORKER === 'on') worker = startWorker(here);
}

/** Lets running work finish, then closes the file. Called once nothing is being served any more. */
export async function stopHouse(): Promise<void> {
	if (!built) return;
	await worker?.stop();
	await writesDone(built.database);
	await Promise.all([built.gateways.images.close(), built.gateways.pdf.close()]);
	await built.database.close();
	built = undefined;
}
