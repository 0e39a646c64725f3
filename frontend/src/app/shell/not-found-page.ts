import { ChangeDetectionStrategy, Component } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { EmptyState } from '../ui/page/empty-state';

@Component({
  selector: 'app-not-found-page',
  imports: [EmptyState, MatButton, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { class: 'page' },
  template: `
    <app-empty-state
      icon="search"
      i18n-heading
      heading="There is nothing here"
      i18n-text
      text="The address is wrong, or what stood here was removed, or it is not for your role."
    >
      <a matButton="outlined" routerLink="/" i18n>To the first page</a>
    </app-empty-state>
  `,
})
export class NotFoundPage {}
