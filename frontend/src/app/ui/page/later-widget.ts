import { NgComponentOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, inject, input, resource } from '@angular/core';
import { LATER_WIDGETS, type WidgetSlot } from '../../core/routing/later-widgets';

/** Shows the widget of a later feature, once it is loaded; nothing where nobody supplies one. */
@Component({
  selector: 'app-later-widget',
  imports: [NgComponentOutlet],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (widget.value(); as loaded) {
      <ng-container *ngComponentOutlet="loaded; inputs: inputs()" />
    }
  `,
  styles: `
    :host {
      display: block;
    }

    :host:empty {
      display: none;
    }
  `,
})
export class LaterWidget {
  private readonly widgets = inject(LATER_WIDGETS, { optional: true });

  readonly slot = input.required<WidgetSlot>();
  /** The inputs of the widget, by name. */
  readonly inputs = input<Record<string, unknown>>({});

  protected readonly widget = resource({
    params: () => this.slot(),
    loader: async ({ params }) => this.widgets?.[params]?.(),
  });
}
