import { expect, it } from 'vitest';
import { matchDestinations } from './match-destinations.ts';

const places = [
  { to: '/a', name: 'New programme', kind: 'page' },
  { to: '/b', name: 'Programmes', kind: 'page' },
  { to: '/c', name: 'Blade', kind: 'design of Curlew 48' },
];
const found = (text: string) => matchDestinations(places, text).map((place) => place.to);

it('finds by every word in name or kind, beginnings first', () => {
  expect(found('prog')).toEqual(['/b', '/a']);
  expect(found('curlew bla')).toEqual(['/c']);
  expect(found('curlew tip')).toEqual([]);
  expect(found('')).toEqual(['/a', '/b', '/c']);
});
