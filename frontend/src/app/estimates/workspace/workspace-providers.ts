import { inject, type Provider } from '@angular/core';
import { shownIn } from '../../core/formats/shown-in';
import { DraftSaving } from '../draft/draft-saving';
import { DraftStore } from '../draft/draft-store';
import { UnfinishedEntries } from '../draft/unfinished-entries';
import { EstimateStore } from '../estimate-store';
import { LiveFigures } from '../figures/live-figures';
import { ZoneColumns } from '../gild/zone-columns';
import { MemberActions } from '../members/member-actions';
import { MemberSelection } from '../members/member-selection';
import { PlanOfPayment } from '../price/plan-of-payment';
import { ReadyDay } from './ready-day';

/** What lives as long as one estimate is open. Pages inject `EstimateStore`, `MemberSelection` and `MemberActions`. */
export const workspaceProviders: Provider[] = [
  DraftStore,
  UnfinishedEntries,
  DraftSaving,
  LiveFigures,
  EstimateStore,
  MemberSelection,
  MemberActions,
  ReadyDay,
  // An estimate keeps its currency, whatever the workshop's is now.
  ...shownIn(() => inject(EstimateStore).currency),
  PlanOfPayment,
  ZoneColumns,
];
