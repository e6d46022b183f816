import 'server-only';
import type { OperationHandler } from '../../operations/define-operation';
import { changeRole } from './change-role';
import { invitePerson } from './invite-person';
import { makeResetLink } from './make-reset-link';
import { removePerson } from './remove-person';
import { revokeLink } from './revoke-link';

/** The writes of this noun, by kind and version. A version that has landed stays. */
export const peopleOperations: readonly OperationHandler[] = [invitePerson, revokeLink, changeRole, removePerson, makeResetLink];
