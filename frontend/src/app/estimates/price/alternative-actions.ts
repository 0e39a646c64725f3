import { Injectable, inject } from '@angular/core';
import type { Member, MemberContent } from '#shared/estimates/member';
import type { Alternative, EstimateSettings } from '#shared/estimates/settings';
import { newId } from '../../core/new-id';
import { Notices } from '../../core/problems/notices';
import type { Edit } from '../draft/edit';
import { EstimateStore } from '../estimate-store';
import { copiedMember } from '../members/copied-member';
import type { ReplaceableItem } from './alternative-items';

/** What copying an item into an alternative makes: edits of members, the further lines, what falls away with the item. */
interface Copy {
  readonly edits: readonly Edit[];
  readonly extras: EstimateSettings['extras'];
  readonly replaced: readonly string[];
}

const longestName = 80;

const contentOf = ({ id: _id, ...content }: Member): MemberContent => content;

function memberCopy(member: Member, { id: alternativeId, name: way }: Alternative): Edit {
  const name = `${member.name}, ${way}`.slice(0, longestName).trim();
  return { kind: 'member', id: newId(), content: { ...copiedMember(contentOf(member)), name, alternativeId } };
}

/** A zone takes its ornaments along, since recutting goes by them; an ornament goes alone. */
function partCopy(member: Member, { id, kind }: ReplaceableItem, alternativeId: string) {
  const zoneId = newId();
  const isAlong = (use: Member['ornaments'][number]) =>
    use.id === id || (kind === 'zone' && use.zoneId === id && use.alternativeId === null);
  const along = member.ornaments.filter(isAlong);
  const zones = member.zones.filter((zone) => zone.id === id).map((zone) => ({ ...zone, id: zoneId, alternativeId }));
  const ornaments = along.map((use) => ({
    ...use,
    id: newId(),
    alternativeId,
    zoneId: use.zoneId === id ? zoneId : use.zoneId,
  }));
  const content: MemberContent = {
    ...contentOf(member),
    zones: [...member.zones, ...zones],
    ornaments: [...member.ornaments, ...ornaments],
  };
  return { content, replaced: along.map((use) => use.id) };
}

/** What one does with alternatives; each is one step of undo and one request. */
@Injectable()
export class AlternativeActions {
  private readonly store = inject(EstimateStore);
  private readonly notices = inject(Notices);

  add(): string {
    const id = newId();
    const alternative: Alternative = { id, name: $localize`Another way`, group: '', note: '', replaces: [] };
    this.store.changeSettings({ alternatives: [...this.alternatives(), alternative] });
    return id;
  }

  replace(alternative: Alternative): void {
    this.store.changeSettings({ alternatives: this.with(alternative) });
  }

  /** An alternative goes with everything that stands in it alone. */
  remove(alternative: Alternative): void {
    const settings = this.store.settings() as EstimateSettings | undefined;
    if (!settings) return;
    const isOthers = (item: { readonly alternativeId: string | null }) => item.alternativeId !== alternative.id;
    const members = this.store.members().flatMap((member) => this.withoutOwn(member, isOthers));
    const extras = settings.extras.filter(isOthers);
    const alternatives = settings.alternatives.filter(({ id }) => id !== alternative.id);
    if (this.store.choice().includes(alternative.id)) this.store.choose([]);
    this.store.apply([...members, this.settingsEdit({ ...settings, alternatives, extras })]);
    this.notices.say($localize`${alternative.name}:name: is removed.`, {
      label: $localize`Undo`,
      run: () => void this.store.undo(),
    });
  }

  /** Doing an item another way: a copy of it that stands in the alternative alone, which takes the place of the first. */
  copyInto(alternative: Alternative, item: ReplaceableItem): void {
    const settings = this.store.settings() as EstimateSettings | undefined;
    if (!settings) return;
    const copy = this.copyOf(item, alternative, settings);
    const replaces = [...new Set([...alternative.replaces, item.id, ...copy.replaced])];
    const alternatives = this.with({ ...alternative, replaces });
    this.store.apply([...copy.edits, this.settingsEdit({ ...settings, alternatives, extras: copy.extras })]);
  }

  private copyOf(item: ReplaceableItem, alternative: Alternative, { extras }: EstimateSettings): Copy {
    if (item.kind === 'extra') {
      const copies = extras.filter(({ id }) => id === item.id);
      const own = copies.map((extra) => ({ ...extra, id: newId(), alternativeId: alternative.id }));
      return { edits: [], extras: [...extras, ...own], replaced: [] };
    }
    const member = this.store.members().find(({ id }) => id === (item.memberId ?? item.id));
    if (!member) return { edits: [], extras, replaced: [] };
    if (item.kind === 'member') return { edits: [memberCopy(member, alternative)], extras, replaced: [] };
    const part = partCopy(member, item, alternative.id);
    return { edits: [{ kind: 'member', id: member.id, content: part.content }], extras, replaced: part.replaced };
  }

  private withoutOwn(member: Member, isOthers: (item: { alternativeId: string | null }) => boolean): Edit[] {
    if (!isOthers(member)) return [{ kind: 'member', id: member.id, content: null }];
    if (member.zones.every(isOthers) && member.ornaments.every(isOthers)) return [];
    const content = {
      ...contentOf(member),
      zones: member.zones.filter(isOthers),
      ornaments: member.ornaments.filter(isOthers),
    };
    return [{ kind: 'member', id: member.id, content }];
  }

  private settingsEdit(content: EstimateSettings): Edit {
    return { kind: 'settings', id: this.store.head()?.id ?? '', content };
  }

  private alternatives(): readonly Alternative[] {
    return this.store.settings()?.alternatives ?? [];
  }

  private with(alternative: Alternative): Alternative[] {
    return this.alternatives().map((one) => (one.id === alternative.id ? alternative : one));
  }
}
