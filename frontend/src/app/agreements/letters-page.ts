import { ChangeDetectionStrategy, Component, computed, inject, input, resource } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { LetterTemplate } from '#shared/agreements/letter-template-schema';
import { listLetterTemplates } from '#shared/agreements/letters-endpoints';
import { Api } from '../core/api/api';
import { EmptyState } from '../ui/page/empty-state';
import { PageHeader } from '../ui/page/page-header';
import { Skeleton } from '../ui/page/skeleton';
import { GivenUpLetters } from './given-up-letters';
import { LetterForm } from './letter-form';
import { letterNames } from './letter-names';

/** The words a workshop writes to its clients, kind by kind, and the letters that could not be delivered. */
@Component({
  selector: 'app-letters-page',
  imports: [EmptyState, GivenUpLetters, LetterForm, MatButton, PageHeader, RouterLink, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './letters-page.html',
  styleUrl: './letters-page.scss',
})
export class LettersPage {
  private readonly api = inject(Api);

  /** The kind that is open, from the address. */
  readonly kind = input<string>();

  protected readonly names = letterNames;
  protected readonly templates = resource({
    loader: async ({ abortSignal }) => (await this.api.call(listLetterTemplates, { signal: abortSignal })).items,
  });
  protected readonly all = computed(() => (this.templates.hasValue() ? this.templates.value() : []));
  protected readonly open = computed(() => this.all().find(({ kind }) => kind === this.kind()) ?? this.all()[0]);

  protected take(kept: LetterTemplate): void {
    this.templates.update((all) => all?.map((one) => (one.kind === kept.kind ? kept : one)));
  }
}
