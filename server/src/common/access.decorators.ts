import { SetMetadata } from '@nestjs/common';
import { type RoleName } from './viewer.js';

export const ACCESS = 'access';

/** Who may call an operation. One without an access rule is refused to everybody. */
export type Access = 'anyone' | 'signed-in' | readonly RoleName[];

/** Visitors too. What they see is narrowed by object, in the services. */
export const AnyoneMay = () => SetMetadata<string, Access>(ACCESS, 'anyone');

/** Whoever has signed in, whatever their role. */
export const SignedInMay = () => SetMetadata<string, Access>(ACCESS, 'signed-in');

/** Only people with one of these roles. */
export const RolesMay = (...roles: RoleName[]) => SetMetadata<string, Access>(ACCESS, roles);
