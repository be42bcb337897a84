/** The house's layers, by where a file lies. The first that fits counts. */
const places = [
	['kernel', /^src\/lib\/kernel\//],
	['domain', /^src\/lib\/domain\//],
	['content', /^(src\/lib\/content|lessons)\//],
	['ui', /^src\/lib\/ui\//],
	['client', /^src\/lib\/client\//],
	['config', /^src\/lib\/server\/config\//],
	['log', /^src\/lib\/server\/log\//],
	['data', /^src\/lib\/server\/data\//],
	['gateways', /^src\/lib\/server\/gateways\//],
	['services', /^src\/lib\/server\/services\//],
	['demo', /^src\/lib\/server\/demo\//],
	['worker', /^src\/lib\/server\/worker\//],
	['http', /^src\/lib\/server\/http\//],
	['routes', /^src\/routes\//],
	['params', /^src\/params\//],
	['hooks', /^src\/(hooks\.|service-worker)/],
	['fakes', /^src\/fakes\//],
	['bin', /^src\/bin\//],
	['types', /^src\/app\.d\.ts$/],
	['style', /^src\/app\.css$/]
] as const;

export type Layer = (typeof places)[number][0];

export function layerOf(path: string): Layer | undefined {
	return places.find(([, shape]) => shape.test(path))?.[0];
}

const pure = ['kernel', 'domain'] as const;
const below = [...pure, 'content', 'config', 'log', 'data', 'gateways'] as const;

/** What each layer may import besides itself: the arrows of DEVELOPERS.md. */
export const mayImport: { readonly [L in Layer]: readonly Layer[] } = {
	kernel: [],
	domain: ['kernel'],
	content: pure,
	ui: pure,
	client: pure,
	config: [],
	log: ['config'],
	data: [...pure, 'config', 'log'],
	gateways: [...pure, 'config', 'log'],
	services: below,
	demo: [...below, 'services'],
	worker: [...below, 'services'],
	http: [...below, 'services', 'demo', 'worker'],
	routes: [...pure, 'content', 'ui', 'client', 'config', 'services', 'http', 'style'],
	params: pure,
	hooks: [...pure, 'client', 'http'],
	fakes: [],
	bin: [...below, 'services', 'demo', 'worker', 'http', 'fakes'],
	types: [...pure, 'services'],
	style: []
};

/** Where a package may be used; one that is not named here may be used anywhere but in the pure layers. */
export const homes: readonly { packages: RegExp; at: RegExp }[] = [
	{ packages: /^(sequelize|sqlite3|umzug)(\/|$)/, at: /^src\/lib\/server\/data\// },
	{ packages: /^stripe(\/|$)/, at: /^src\/lib\/server\/gateways\/stripe\// },
	{ packages: /^nodemailer(\/|$)/, at: /^src\/lib\/server\/gateways\/mail\// },
	{ packages: /^sharp(\/|$)/, at: /^src\/(lib\/server\/gateways\/images|bin\/films)\// },
	{ packages: /^pdfkit(\/|$)/, at: /^src\/lib\/server\/gateways\/pdf\// },
	{ packages: /^qrcode(\/|$)/, at: /^src\/lib\/server\/gateways\/(qr|pdf)\// },
	{ packages: /^@node-rs\/argon2$/, at: /^src\/lib\/server\/gateways\/passwords\// },
	{ packages: /^@auth\//, at: /^src\/(lib\/server\/http\/auth\/|app\.d\.ts)/ },
	{ packages: /^(smtp-server|mailparser)(\/|$)/, at: /^src\/fakes\// },
	{
		packages: /^(@sveltejs\/kit|\$app|\$service-worker)(\/|$)/,
		at: /^src\/(lib\/server\/http|lib\/ui\/forms|lib\/client|routes|params|hooks\.|service-worker|app\.d\.ts)/
	},
	{ packages: /^@stdlib\//, at: /^src\/lib\/kernel\/statistics\/distributions\// },
	{ packages: /^\$env\//, at: /^$/ }
];

/** Packages that the pure layers may use: nothing that reads a clock, chance, files or a network. */
export const pureAllowed: { readonly [L in 'kernel' | 'domain']: RegExp } = {
	kernel:
		/^@stdlib\/math-base-special-(betainc|digamma|erfc|erfcinv|gammainc|gammaincinv|gammaln|kernel-betaincinv)$/,
	domain: /^(zod|canonicalize|csv-parse\/sync)$/
};
