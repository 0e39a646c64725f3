import { CdkDragHandle } from '@angular/cdk/drag-drop';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { Icon } from '../icon/icon';

/** What a hand takes a thing by to put it elsewhere. Whoever holds it says where it stands, and shows it where it is pointed at; keys move things by Alt and the arrows. */
@Component({
  selector: 'app-grip',
  imports: [Icon],
  hostDirectives: [CdkDragHandle],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { class: 'grip no-print', 'aria-hidden': 'true' },
  template: `<app-icon name="drag" />`,
  styles: `
    :host {
      position: absolute;
      display: grid;
      width: 20px;
      color: var(--muted);
      cursor: grab;
      opacity: 0;
      place-items: center;
      touch-action: none;
    }

    app-icon {
      width: 16px;
      height: 16px;
    }

    @media (hover: none) {
      :host {
        opacity: 1;
      }
    }
  `,
})
export class Grip {}
