import { changePasswordSchema } from '@/lib/schemas/session';
import { personRoute } from '@/lib/server/http/person-route';
import { changePassword } from '@/lib/server/services/session/change-password';

export const POST = personRoute({ body: changePasswordSchema, service: changePassword });
