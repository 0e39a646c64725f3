import { ChangeDetectionStrategy, Component } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { PageHeader } from '../ui/page/page-header';

@Component({
  selector: 'app-not-found-page',
  imports: [MatButton, PageHeader, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-page-header i18n-heading heading="There is nothing here" />
    <div class="page stack">
      <p i18n>The address is wrong, or what stood here was removed, or it is not for your role.</p>
      <p><a matButton="outlined" routerLink="/" i18n>To the first page</a></p>
    </div>
  `,
})
export class NotFoundPage {}
