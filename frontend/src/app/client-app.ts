import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { RouterOutlet } from '@angular/router';
import { Notices } from './core/problems/notices';
import { NoticeList } from './ui/notice/notice-list';

/**
 * The application of clients. What is said in passing has its place from the start, so that it is read aloud, but comes with the first of it, for it
 * brings buttons along; fetched before that, since the line may be what it complains of.
 */
@Component({
  selector: 'app-root',
  imports: [NoticeList, RouterOutlet],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <router-outlet />
    <div aria-live="polite">
      @defer (when notices.current().length > 0; prefetch on timer(6s)) {
        <app-notice-list />
      }
    </div>
  `,
})
export class ClientApp {
  protected readonly notices = inject(Notices);
}
