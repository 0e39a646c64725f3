import type { MemberFigures } from '#shared/estimates/figures';
import type { Member } from '#shared/estimates/member';
import type { ProfileElement } from '#shared/measure/profile-element';
import type { Formats } from '../../core/formats/formats';
import { elementName, shapeNames } from '../../measure';

const mostNamed = 3;

const heightOf = (element: ProfileElement): number => ('height_mm' in element ? element.height_mm : element.up_mm);

/** “ovolo of 30 mm over fillet of 12 mm”, from the top down; a profile of many members by its name alone. */
function profileText(profile: readonly ProfileElement[], formats: Formats): string {
  const named = [...profile]
    .reverse()
    .map(
      (element) => $localize`${elementName(element.element)}:element: of ${formats.length(heightOf(element))}:height:`,
    );
  return named.length > 0 && named.length <= mostNamed ? named.join($localize` over `) : '';
}

/** What a member is, in a line under its name: shape or profile, timber, girth, run, how many. */
export function memberAbout(member: Member, figures: MemberFigures | undefined, formats: Formats): string {
  const { shape, count } = member;
  const profile = 'profile' in shape ? profileText(shape.profile, formats) : '';
  return [
    profile || shapeNames[shape.kind].toLowerCase(),
    figures?.girth_mm ? $localize`girth ${formats.length(figures.girth_mm)}:girth:` : '',
    figures?.run_mm ? $localize`run ${formats.length(figures.run_mm)}:run:` : '',
    figures?.timber.toLowerCase(),
    count > 1 ? $localize`${formats.number(count, 0)}:count: alike` : '',
  ]
    .filter(Boolean)
    .join(', ');
}
