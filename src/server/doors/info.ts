import type { Permission } from '@/core/permissions';

/** Who may come through a door; the access matrix test reads it. */
export interface DoorInfo {
  kind: 'page' | 'action' | 'route';
  who: 'anyone' | 'account' | 'club';
  permission: Permission | null;
}

export interface Door {
  door: DoorInfo;
}

export function withInfo<F extends object>(run: F, door: DoorInfo): F & Door {
  return Object.assign(run, { door });
}

export type Params = Record<string, string>;
export type Search = Record<string, string | string[] | undefined>;
