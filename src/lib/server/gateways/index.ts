import type { Images } from './images';
import type { Mailer } from './mail';
import type { PdfPrinter } from './pdf';
import type { Signing } from './signing';
import type { Storage } from './storage';
import type { Till } from './stripe';

/** Everything outside the process, each behind one interface. `http/boot.ts` builds them. */
export type Gateways = {
	images: Images;
	mailer: Mailer;
	pdf: PdfPrinter;
	signing: Signing;
	storage: Storage;
	till: Till;
};
