import { answering, respond } from '@/lib/server/http/respond';
import { readHealth } from '@/lib/server/services/session/read-health';

export const dynamic = 'force-dynamic';

export const GET = () => answering(async () => respond(await readHealth()));
