import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterOutlet } from '@angular/router';
import { NoticeList } from './ui/notice/notice-list';

/** The application of clients; what is said in passing has its place once the first page stands, for it brings buttons along. */
@Component({
  selector: 'app-root',
  imports: [NoticeList, RouterOutlet],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <router-outlet />
    @defer (on idle) {
      <app-notice-list />
    }
  `,
})
export class ClientApp {}
