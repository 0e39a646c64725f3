import {
  ChangeDetectionStrategy,
  Component,
  booleanAttribute,
  computed,
  inject,
  input,
  type OnInit,
  output,
} from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import {
  clientContentSchema,
  clientKinds,
  clientSchema,
  type Client,
  type ClientContent,
} from '#shared/jobs/client-schema';
import { RowForm } from '../core/forms/row-form';
import { holdWhileDirty } from '../core/forms/hold-while-dirty';
import { newId } from '../core/new-id';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { focusFirst } from '../ui/field/focus-first';
import { TextField } from '../ui/field/text-field';
import { ClientCalls } from './client-calls';
import { clientDifferences } from './client-differences';
import { clientKindNames } from './client-kind-names';
import { KeptFoot } from './kept-foot';

const nothing: ClientContent = {
  ...{ name: '', kind: 'person', contact: '', email: '', telephone: '', address: '' },
  ...{ website: '', taxRegistration: '', note: '' },
};

/** Enters a client or changes one. */
@Component({
  selector: 'app-client-form',
  imports: [Entry, Field, KeptFoot, ReactiveFormsModule, TextField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './client-form.html',
})
export class ClientForm implements OnInit {
  private readonly calls = inject(ClientCalls);

  /** The client to be changed; without one a new client is entered. */
  readonly client = input<Client>();
  readonly name = input('');
  /** Asks only for what a new job’s papers need; the rest can be added to the entry later. */
  readonly brief = input(false, { transform: booleanAttribute });
  readonly kept = output<Client>();
  readonly closed = output();

  private readonly row = new RowForm(clientContentSchema, { row: clientSchema, begin: nothing, newId: newId() });
  protected readonly form = this.row.form;
  protected readonly kinds = clientKinds.map((kind) => ({ kind, name: clientKindNames[kind] }));
  protected readonly differences = computed(() => clientDifferences(this.form.parsed(), this.row.meanwhile()));

  protected readonly sendLabel = computed(() =>
    this.client() ? $localize`Keep the client` : $localize`Enter the client`,
  );

  constructor() {
    holdWhileDirty(this.form);
    focusFirst();
  }

  ngOnInit(): void {
    const client = this.client();
    if (client) this.row.show(client);
    else this.form.reset({ ...nothing, name: this.name() });
  }

  protected async send(): Promise<void> {
    this.tell(await this.row.send((seen, content) => this.calls.keep(seen, content)));
  }

  protected async keepMine(): Promise<void> {
    this.tell(await this.row.sendOver((seen, content) => this.calls.keep(seen, content)));
  }

  protected takeTheirs(): void {
    const client = this.row.meanwhile();
    if (!client) return;
    this.row.show(client);
    this.kept.emit(client);
  }

  private tell(client: Client | undefined): void {
    if (client) this.kept.emit(client);
  }
}
