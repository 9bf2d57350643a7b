import type { ComponentType } from 'react';
import type { MeDto } from '#shared/schemas/auth.ts';
import { ListIcon, StrandIcon, SunIcon } from '#src/components/place-icons.tsx';

export interface Place {
  to: string;
  label: string;
  /** Other addresses at which this place is the current one. */
  isAlso?: RegExp;
  /** Drawn in the tab bar of a phone. */
  icon?: ComponentType;
}

const studentPlaces: Place[] = [
  { to: '/today', label: 'Today', icon: SunIcon },
  { to: '/set/mixed', label: 'Mixed set', icon: StrandIcon, isAlso: /^\/sets?\// },
  { to: '/topics', label: 'Topics', icon: ListIcon },
];

/** Where a person can go: only pages that exist and are theirs. */
export function placesOf({ can }: Pick<MeDto, 'can'>): Place[] {
  const places: Place[] = can.practise ? [...studentPlaces] : [];
  if (can.writeQuestions || can.reviewQuestions) places.push({ to: '/questions', label: 'Questions' });
  if (can.reviewQuestions) places.push({ to: '/review', label: 'Review' });
  if (can.writeQuestions) places.push({ to: '/subjects', label: can.practise ? 'Specification' : 'Topics' });
  if (can.readItemStatistics) places.push({ to: '/item-statistics', label: 'Item statistics' });
  if (places.length === 0) places.push({ to: '/home', label: 'Home' });
  if (can.readEstimates) places.push({ to: '/estimates', label: 'Estimates' });
  if (can.manageSchool) places.push({ to: '/settings/practice', label: 'Settings' });
  return places;
}

/** True where `pathname` belongs to the place. */
export const isCurrent = (place: Place, pathname: string): boolean =>
  pathname === place.to || pathname.startsWith(`${place.to}/`) || (place.isAlso?.test(pathname) ?? false);
