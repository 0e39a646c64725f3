import type { Routes } from '@angular/router';
import { roleGuard } from '../core/session/role-guard';

/** What somebody who is not signed in may open; the links of mails lead to `/found`, `/join` and `/new-password`. */
export const strangerRoutes: Routes = [
  {
    path: 'sign-in',
    title: $localize`Sign in`,
    loadComponent: () => import('./sign-in-page').then(({ SignInPage }) => SignInPage),
  },
  {
    path: 'forgotten-password',
    title: $localize`A new password`,
    loadComponent: () => import('./forgotten-password-page').then(({ ForgottenPasswordPage }) => ForgottenPasswordPage),
  },
  {
    path: 'new-password',
    title: $localize`Choose a new password`,
    loadComponent: () => import('./new-password-page').then(({ NewPasswordPage }) => NewPasswordPage),
  },
  {
    path: 'new-workshop',
    title: $localize`Found a workshop`,
    loadComponent: () => import('./new-workshop-page').then(({ NewWorkshopPage }) => NewWorkshopPage),
  },
  {
    path: 'found',
    title: $localize`Found a workshop`,
    loadComponent: () => import('./found-page').then(({ FoundPage }) => FoundPage),
  },
  {
    path: 'join',
    title: $localize`An invitation`,
    loadComponent: () => import('./join-page').then(({ JoinPage }) => JoinPage),
  },
  {
    path: 'choose-workshop',
    title: $localize`Your workshops`,
    loadComponent: () => import('./choose-workshop-page').then(({ ChooseWorkshopPage }) => ChooseWorkshopPage),
  },
];

/** What belongs to a workshop and its people, inside the shell. */
export const memberRoutes: Routes = [
  {
    path: 'people',
    title: $localize`People`,
    loadComponent: () => import('./people-page').then(({ PeoplePage }) => PeoplePage),
  },
  {
    path: 'workshop',
    canMatch: [roleGuard('owner')],
    title: $localize`Workshop settings`,
    loadComponent: () => import('./workshop-page').then(({ WorkshopPage }) => WorkshopPage),
  },
  {
    path: 'profile',
    title: $localize`Your profile`,
    loadComponent: () => import('./profile-page').then(({ ProfilePage }) => ProfilePage),
  },
];
