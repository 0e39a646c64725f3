import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { Router } from '@angular/router';
import type { Client } from '#shared/jobs/client-schema';
import { PageHeader } from '../ui/page/page-header';
import { ClientForm } from './client-form';

@Component({
  selector: 'app-new-client-page',
  imports: [ClientForm, PageHeader],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-page-header i18n-heading heading="Enter a client" />
    <div class="page narrow">
      <app-client-form (kept)="show($event)" (closed)="leave()" />
    </div>
  `,
})
export class NewClientPage {
  private readonly router = inject(Router);

  protected show(client: Client): void {
    void this.router.navigate(['/clients', client.id], { replaceUrl: true });
  }

  protected leave(): void {
    void this.router.navigateByUrl('/clients');
  }
}
