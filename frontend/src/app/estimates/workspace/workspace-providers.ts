import type { Provider } from '@angular/core';
import { DraftSaving } from '../draft/draft-saving';
import { DraftStore } from '../draft/draft-store';
import { UnfinishedEntries } from '../draft/unfinished-entries';
import { EstimateStore } from '../estimate-store';
import { LiveFigures } from '../figures/live-figures';
import { MemberActions } from '../members/member-actions';
import { MemberSelection } from '../members/member-selection';
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
];
