import { type RoleName } from '../common/viewer.js';

export interface AccountChange {
  readonly roles: readonly RoleName[];
  readonly disabled: boolean;
}

/**
 * Whether a change would leave nobody who can administer.
 *
 * @param activeAdministratorIds of people who have a password and are not disabled
 */
export function leavesNoAdministrator(
  personId: string,
  change: AccountChange,
  activeAdministratorIds: readonly string[],
): boolean {
  if (!activeAdministratorIds.includes(personId)) return false;
  const stays = change.roles.includes('ADMINISTRATOR') && !change.disabled;
  return !stays && activeAdministratorIds.length === 1;
}
