import type { Order } from '../edition-address';

/** How a list of stations is ordered, in words. */
export function orderWords({ sort, direction }: Order): string {
  const isDescending = direction === 'desc';
  switch (sort) {
    case 'frequency':
      return isDescending ? $localize`highest frequency first` : $localize`lowest frequency first`;
    case 'name':
      return isDescending ? $localize`by name, from the end` : $localize`by name`;
    case 'power':
      return isDescending ? $localize`most power first` : $localize`least power first`;
    case 'distance':
      return isDescending ? $localize`farthest first` : $localize`nearest first`;
    case 'field':
      return isDescending ? $localize`strongest first` : $localize`weakest first`;
  }
}

/** Orders to choose from where a list has no heads. */
export const ORDERS: readonly Order[] = [
  { sort: 'frequency', direction: 'asc' },
  { sort: 'name', direction: 'asc' },
  { sort: 'power', direction: 'desc' },
];

/** The same where a site is chosen. */
export const ORDERS_AT_SITE: readonly Order[] = [
  ...ORDERS,
  { sort: 'distance', direction: 'asc' },
  { sort: 'field', direction: 'desc' },
];
