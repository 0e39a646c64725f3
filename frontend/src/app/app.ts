import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterOutlet } from '@angular/router';
import { NoticeList } from './ui/notice/notice-list';

@Component({
  selector: 'app-root',
  imports: [NoticeList, RouterOutlet],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<router-outlet /><app-notice-list />`,
})
export class App {}
