import { ChangeDetectionStrategy, Component, inject, input, type OnInit } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { workshopSettingsSchema, type Workshop } from '#shared/accounts/workshop-schema';
import { taxCodeChoices } from '../core/formats/tax-code-names';
import { schemaForm } from '../core/forms/schema-form';
import { Notices } from '../core/problems/notices';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { LinesEntry } from '../ui/field/lines-entry';
import { HabitFields } from './habit-fields';
import { WorkshopStore } from './workshop-store';

type Settings = Omit<Workshop, 'id' | 'version' | 'logoFileId'>;

/** What an owner enters of a workshop, without what the server adds. */
const settingsOf = ({ id: _id, version: _version, logoFileId: _logo, ...settings }: Workshop): Settings => settings;

const nothing = {
  name: '',
  currency: '',
  locale: '',
  lengthUnit: null,
  timeZone: '',
  paperSize: null,
  country: '',
  addressLines: [],
  telephone: '',
  email: '',
  taxRegistration: '',
  defaultTaxCategory: null,
};

/** The settings of the workshop: letterhead, habits, tax. */
@Component({
  selector: 'app-workshop-form',
  imports: [Entry, Field, FormComplaint, HabitFields, LinesEntry, MatButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './workshop-form.html',
})
export class WorkshopForm implements OnInit {
  private readonly store = inject(WorkshopStore);
  private readonly notices = inject(Notices);

  readonly workshop = input.required<Workshop>();

  protected readonly form = schemaForm(workshopSettingsSchema, nothing);
  protected readonly message = (name: string): string => this.form.message(name);
  protected readonly categories = taxCodeChoices.map(({ value, label }) => ({ value, label: `${value}, ${label}` }));

  ngOnInit(): void {
    this.form.reset(settingsOf(this.workshop()));
  }

  protected async send(): Promise<void> {
    const wasTaken = await this.form.send(async (body) => this.form.reset(settingsOf(await this.store.keep(body))));
    if (wasTaken) this.notices.say($localize`The settings are kept.`);
  }
}
