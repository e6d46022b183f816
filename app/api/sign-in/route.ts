import { signInSchema } from '@/lib/schemas/session';
import { openRoute } from '@/lib/server/http/person-route';
import { signIn } from '@/lib/server/services/session/sign-in';

export const POST = openRoute({ body: signInSchema, service: signIn });
