import { z } from 'zod';
import { openRoute } from '@/lib/server/http/person-route';
import { signOut } from '@/lib/server/services/session/sign-out';

export const POST = openRoute({ body: z.object({}), service: signOut });
