/** Whether the process answers at all. It asks nothing, so it tells a stuck one from a busy one. */
export const GET = () => new Response('alive', { headers: { 'cache-control': 'no-store' } });
