import { inject } from '@angular/core';
import type { CanMatchFn } from '@angular/router';
import type { Role } from '#shared/actor/role';
import { Session } from './session';

/** Lets only these roles pass; for anybody else the address does not exist. */
export const roleGuard =
  (...roles: readonly Role[]): CanMatchFn =>
  () =>
    inject(Session).may(...roles);
