import { type Allotment, faultOf, type Given } from './allotment';

export type ChoiceReason =
  /** A rule of booking forbids it: its own words. */
  | { kind: 'rule'; text: string }
  | { kind: 'taken'; by: number }
  /** Too near a stand given to another, or on the way to it. */
  | { kind: 'blocked'; by: number }
  /** It was free, and giving it would have left others worse off by more. */
  | { kind: 'total' };

/** Why a member was not given a stand. `ruleText` is set when booking itself forbids it. */
export function whyNot(
  allotment: Allotment,
  given: Given,
  ask: { member: number; stand: number; ruleText: string | null },
): ChoiceReason {
  const { member, stand, ruleText } = ask;
  if (ruleText !== null) return { kind: 'rule', text: ruleText };
  const holder = given.findIndex((other, index) => other === stand && index !== member);
  if (holder >= 0) return { kind: 'taken', by: holder };
  const moved = given.map((other, index) => (index === member ? stand : other));
  if (faultOf(allotment, moved) === null) return { kind: 'total' };
  const by = moved.findIndex((other, index) => {
    if (index === member || other === null) return false;
    return (
      faultOf(
        allotment,
        moved.map((one, at) => (at === index ? null : one)),
      ) === null
    );
  });
  return by >= 0 ? { kind: 'blocked', by } : { kind: 'total' };
}
