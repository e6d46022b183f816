import { preferencesSchema } from '@/lib/schemas/session';
import { personRoute } from '@/lib/server/http/person-route';
import { changePreferences } from '@/lib/server/services/session/change-preferences';

export const POST = personRoute({ body: preferencesSchema, service: changePreferences });
