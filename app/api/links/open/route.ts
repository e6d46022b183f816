import { openLinkSchema } from '@/lib/schemas/session';
import { openRoute } from '@/lib/server/http/person-route';
import { enterByLink } from '@/lib/server/services/session/enter-by-link';

export const POST = openRoute({ body: openLinkSchema, service: enterByLink });
