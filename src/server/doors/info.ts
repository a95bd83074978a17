import type { z } from 'zod';
import type { Permission } from '@/core/permissions';

/** Who may come through a door and what it takes; the tests that walk all doors read it. */
export interface DoorInfo {
  kind: 'page' | 'action' | 'route';
  who: 'anyone' | 'account' | 'club';
  permission: Permission | null;
  /** Shape of the body or the query; null for a page. */
  takes: z.ZodType | null;
}

export interface Door {
  door: DoorInfo;
}

export function withInfo<F extends object>(run: F, door: DoorInfo): F & Door {
  return Object.assign(run, { door });
}

export type Params = Record<string, string>;
export type Search = Record<string, string | string[] | undefined>;
