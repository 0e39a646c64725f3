import type { ClientActor } from '#shared/actor/client-actor';
import type { Endpoint } from '#shared/actor/endpoint';
import { audienceOf, audiences, type Audience } from '#shared/actor/role';
import { Rejection } from '#shared/problems/rejection';
import type { SignedIn } from '../session/session-control';

/** Refuses a caller whom the endpoint does not name: 401 for nobody, 403 for the wrong role. */
export function guard(endpoint: Endpoint, signedIn: SignedIn | undefined, client?: ClientActor): void {
  const { callers } = endpoint;
  if (callers === 'anyone') return;
  if (callers === 'client') {
    if (!client) throw new Rejection('signed-out', 'problem-visit-over');
    return;
  }
  if (!signedIn) throw new Rejection('signed-out', 'problem-signed-out');
  if (callers === 'signed-in') return;
  if (!signedIn.actor?.roles.some((role) => callers.includes(role)))
    throw new Rejection('not-allowed', 'problem-not-allowed');
}

/** The widest audience among those the endpoint answers that a caller is entitled to. */
export function audienceFor(endpoint: Endpoint, signedIn: SignedIn | undefined): Audience | undefined {
  const widest = endpoint.callers !== 'client' && signedIn?.actor ? audienceOf(signedIn.actor.roles) : 'public';
  return audiences.slice(audiences.indexOf(widest)).find((audience) => endpoint.answers[audience]);
}
