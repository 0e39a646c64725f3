import { ChangeDetectionStrategy, Component } from '@angular/core';
import { PageHeader } from '../../ui/page/page-header';
import { ProgrammeParts } from '../programme-parts';
import { CalendarFeeds } from './calendar-feeds';

/** The calendars other programs read of this workshop. */
@Component({
  selector: 'app-calendars-page',
  imports: [CalendarFeeds, PageHeader, ProgrammeParts],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-page-header i18n-heading heading="Calendars for other programs" />
    <app-programme-parts />
    <div class="page narrow"><app-calendar-feeds /></div>
  `,
})
export class CalendarsPage {}
