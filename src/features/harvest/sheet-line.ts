import { formatWeight, type Units } from '@/core/units';
import { momentText } from '@/features/clubs/words/audit-text';
import { WEAPON_WORDS } from '@/features/ground/words/kinds';
import type { ClubScope } from '@/server/scope';
import { deerKind } from './deer-kind';
import type { HarvestRow, Sheet } from './harvests-data';
import { AGE_WORDS, DEER_KIND_WORDS } from './words/deer';
import { lengthWords, SHEET_WORDS } from './words/sheet';

export interface SheetLine {
  id: string;
  whenText: string;
  hunter: string;
  deer: string;
  age: string;
  weight: string;
  antlers: string;
  where: string;
  weapon: string;
}

function hunterText({ sheet, memberName }: Sheet): string {
  return sheet.guestName === '' ? memberName : SHEET_WORDS.guestOf(sheet.guestName, memberName);
}

function antlersText(row: HarvestRow, units: Units): string {
  const { pointsLeft, pointsRight, insideSpreadMm } = row;
  const parts = [
    (pointsLeft !== null || pointsRight !== null) && SHEET_WORDS.points(pointsLeft, pointsRight),
    insideSpreadMm !== null && SHEET_WORDS.spread(lengthWords(insideSpreadMm, units)),
  ].filter((part) => part !== false);
  return parts.join(', ');
}

export function sheetLine(scope: ClubScope, one: Sheet): SheetLine {
  const { sheet, standName } = one;
  const { club } = scope;
  return {
    id: sheet.id,
    whenText: momentText(sheet.takenAt, club),
    hunter: hunterText(one),
    deer: DEER_KIND_WORDS[deerKind(sheet)],
    age: sheet.age === null ? '' : AGE_WORDS[sheet.age],
    weight: sheet.dressedKg === null ? '' : formatWeight(sheet.dressedKg, club.units),
    antlers: antlersText(sheet, club.units),
    where: standName ?? sheet.place,
    weapon: WEAPON_WORDS[sheet.weapon],
  };
}
