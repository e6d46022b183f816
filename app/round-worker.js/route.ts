import { serveRoundWorker } from '@/lib/server/round/serve-round-worker';

export const dynamic = 'force-dynamic';
export const GET = serveRoundWorker;
