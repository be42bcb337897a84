import { json } from '@sveltejs/kit';
import { describeApi } from '$lib/server/http/api/describe';
import type { RequestHandler } from './$types';

export const GET: RequestHandler = ({ locals }) => json(describeApi(locals.house.config.ORIGIN));
