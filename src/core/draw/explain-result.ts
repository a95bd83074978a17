import { type Allotment, faultOf, type Given, nothingGiven } from './allotment';

export type ChoiceReason =
  /** A rule of booking forbids it: its own words. */
  | { kind: 'rule'; text: string }
  | { kind: 'taken'; by: number }
  /** A place given to `by` (who may be the member) does not go with it. */
  | { kind: 'blocked'; by: number; place: number }
  /** As many as the club, the stand or the guests allow were given. */
  | { kind: 'limit' }
  /** It was free, and giving it would have left others worse off by more. */
  | { kind: 'total' };

export interface ChoiceAsk {
  member: number;
  place: number;
  /** Set when booking itself forbids it. */
  ruleText: string | null;
}

/** Why a member was not given a place. */
export function whyNot(allotment: Allotment, given: Given, { member, place, ruleText }: ChoiceAsk): ChoiceReason {
  if (ruleText !== null) return { kind: 'rule', text: ruleText };
  const slot = allotment.slotOf[place];
  const holder = given.findIndex((row, index) => index !== member && row.includes(place));
  if (holder >= 0) return { kind: 'taken', by: holder };
  const moved = given.map((row, index) => row.map((one, at) => (index === member && at === slot ? place : one)));
  const fault = faultOf(allotment, moved);
  if (fault === null) return { kind: 'total' };
  if (fault === 'limit') return { kind: 'limit' };
  const others = given.flatMap((row, by) =>
    row.flatMap((one, at) => (one === null || (by === member && at === slot) ? [] : [{ by, at, place: one }])),
  );
  const blocking =
    others.find(({ by, at }) => {
      const without = moved.map((row, index) => row.map((one, n) => (index === by && n === at ? null : one)));
      return faultOf(allotment, without) === null;
    }) ??
    others.find((other) => {
      const alone = nothingGiven(allotment).map((row, index) =>
        row.map((_, at) => {
          if (index === member && at === slot) return place;
          return index === other.by && at === other.at ? other.place : null;
        }),
      );
      return faultOf(allotment, alone) !== null;
    });
  return blocking ? { kind: 'blocked', by: blocking.by, place: blocking.place } : { kind: 'total' };
}
