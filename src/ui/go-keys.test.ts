import { expect, it } from 'vitest';
import { goKeys, meaningOf } from './go-keys';

it('gives each label a letter of its own, the first that is free', () => {
  expect(goKeys(['Sit', 'Week', 'Season', 'Stands', 'My sits'])).toEqual(['s', 'w', 'e', 't', 'm']);
  expect(goKeys(['Aa', 'A', '!'])).toEqual(['a', null, null]);
});

it('goes to a place only after g, where g itself may be a place', () => {
  const places = new Map([
    ['g', '/ground'],
    ['j', '/jobs'],
  ]);
  expect(meaningOf('g', false, places)).toEqual({ do: 'wait' });
  expect(meaningOf('g', true, places)).toEqual({ go: '/ground' });
  expect(meaningOf('j', true, places)).toEqual({ go: '/jobs' });
  expect(meaningOf('j', false, places)).toEqual({ do: 'next_row' });
  expect(meaningOf('x', true, places)).toEqual({ do: 'none' });
  expect(meaningOf('?', false, places)).toEqual({ do: 'list' });
});
