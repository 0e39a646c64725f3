import type { Role } from '#shared/actor/role';

/** Somebody of the demonstration workshop; all of them are invented. */
export interface DemonstrationPerson {
  readonly name: string;
  readonly email: string;
  readonly roles: readonly [Role, ...Role[]];
}

export const demonstrationWorkshop = {
  name: 'Harbour Lane Carvers and Gilders',
  currency: 'EUR',
  locale: 'en-IE',
  lengthUnit: 'mm',
  timeZone: 'Europe/Dublin',
  paperSize: 'A4',
  country: 'IE',
} as const;

export const demonstrationSettings = {
  ...demonstrationWorkshop,
  addressLines: ['Harbour Lane Carvers and Gilders', '7 Harbour Lane', 'Dunmara'],
  telephone: '+353 1 555 0142',
  email: 'workshop@harbourlane.example',
  taxRegistration: 'IE0000000XX',
  defaultTaxCategory: 'S',
} as const;

/** The first of them founds the workshop. */
export const demonstrationPeople: readonly [DemonstrationPerson, ...DemonstrationPerson[]] = [
  { name: 'Orla Fennimore', email: 'owner@harbourlane.example', roles: ['owner'] },
  { name: 'Tobias Wrenfield', email: 'estimator@harbourlane.example', roles: ['estimator', 'bench'] },
  { name: 'Jonah Pikesley', email: 'bench@harbourlane.example', roles: ['bench'] },
  { name: 'Mirren Castlemay', email: 'office@harbourlane.example', roles: ['office'] },
];
