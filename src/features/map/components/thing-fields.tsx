'use client';

import type { ReactNode } from 'react';
import { FEATURE_KINDS, STAND_KINDS } from '@/core/ground-types';
import { LAYER_SHAPES, MAP_LAYERS } from '@/core/map-layers';
import { mToYd, ydToM } from '@/core/units';
import { DIRECTION_WORDS, FEATURE_KIND_WORDS, STAND_KIND_WORDS } from '@/features/ground/words/kinds';
import { NumberInput, Select, TextInput } from '@/ui/text-inputs';
import type { ApproachThing, ItemThing, MapClub, MapThing } from '../thing';
import { THING_FIELD_WORDS } from '../words/editing';
import { LAYER_WORDS } from '../words/things';
import { ArcFields } from './arc-fields';

export interface FieldsProps {
  thing: MapThing;
  things: readonly MapThing[];
  club: MapClub;
  onChange: (thing: MapThing, tag: string | null) => void;
}

const options = <T extends string>(
  values: readonly T[],
  words: Readonly<Record<NoInfer<T>, string>>,
): { value: T; label: string }[] => values.map((value) => ({ value, label: words[value] }));

const WALKED = ['in', 'out', 'both'] as const;

/** What may be typed of a thing on the map. */
export function ThingFields(props: FieldsProps) {
  const { thing, onChange } = props;
  return (
    <div className="grid gap-3">
      <TextInput
        label={THING_FIELD_WORDS.name}
        autoComplete="off"
        optional={thing.kind === 'item'}
        maxLength={60}
        value={thing.name}
        error={thing.name.trim() === '' && thing.kind !== 'item' ? THING_FIELD_WORDS.giveName : undefined}
        onChange={({ target }) => onChange({ ...thing, name: target.value }, `name:${thing.id}`)}
      />
      {kindFields(props)}
    </div>
  );
}

function kindFields({ thing, things, club, onChange }: FieldsProps): ReactNode {
  switch (thing.kind) {
    case 'stand':
      return (
        <>
          <Select
            label={THING_FIELD_WORDS.kind}
            value={thing.what}
            options={options(STAND_KINDS, STAND_KIND_WORDS)}
            onChange={({ target }) => {
              const what = STAND_KINDS.find((one) => one === target.value);
              if (what) onChange({ ...thing, what }, null);
            }}
          />
          <ArcFields
            arcs={thing.arcs}
            onChange={(arcs, field) => onChange({ ...thing, arcs }, `arcs:${thing.id}:${field}`)}
          />
        </>
      );
    case 'feature':
      return (
        <Select
          label={THING_FIELD_WORDS.kind}
          value={thing.what}
          options={options(FEATURE_KINDS, FEATURE_KIND_WORDS)}
          onChange={({ target }) => {
            const what = FEATURE_KINDS.find((one) => one === target.value);
            if (what) onChange({ ...thing, what }, null);
          }}
        />
      );
    case 'approach':
      return <ApproachFields thing={thing} things={things} onChange={onChange} />;
    case 'item':
      return <ItemFields thing={thing} club={club} onChange={onChange} />;
    default:
      return null;
  }
}

function ApproachFields({
  thing,
  things,
  onChange,
}: { thing: ApproachThing } & Pick<FieldsProps, 'things' | 'onChange'>) {
  const named = (kind: 'stand' | 'parking') =>
    things.filter((one) => one.kind === kind).map(({ id, name }) => ({ value: id, label: name }));
  return (
    <>
      <Select
        label={THING_FIELD_WORDS.leadsTo}
        value={thing.standId}
        options={named('stand')}
        onChange={({ target }) => onChange({ ...thing, standId: target.value }, null)}
      />
      <Select
        label={THING_FIELD_WORDS.fromParkingPlace}
        value={thing.parkingId ?? ''}
        options={[{ value: '', label: THING_FIELD_WORDS.none }, ...named('parking')]}
        onChange={({ target }) => onChange({ ...thing, parkingId: target.value || null }, null)}
      />
      <Select
        label={THING_FIELD_WORDS.walked}
        value={thing.direction}
        options={options(WALKED, DIRECTION_WORDS)}
        onChange={({ target }) => {
          const direction = WALKED.find((one) => one === target.value);
          if (direction) onChange({ ...thing, direction }, null);
        }}
      />
    </>
  );
}

function shapeOf(thing: MapThing) {
  if (thing.geometry.type === 'Point') return 'point';
  return thing.geometry.type === 'LineString' ? 'line' : 'area';
}

function ItemFields({ thing, club, onChange }: { thing: ItemThing } & Pick<FieldsProps, 'club' | 'onChange'>) {
  const layers = MAP_LAYERS.filter((layer) => LAYER_SHAPES[layer].includes(shapeOf(thing)));
  const { sector } = thing.props;
  const us = club.units === 'us';
  const turn = (key: 'fromDeg' | 'toDeg' | 'reachM', text: string, most: number, scale = 1) => {
    const value = Number(text);
    if (!sector || text === '' || !Number.isFinite(value) || value < 0 || value > most) return;
    onChange(
      {
        ...thing,
        props: { ...thing.props, sector: { ...sector, [key]: Math.max(key === 'reachM' ? 1 : 0, value * scale) } },
      },
      `sector:${thing.id}`,
    );
  };
  return (
    <>
      <Select
        label={THING_FIELD_WORDS.kind}
        value={thing.what}
        options={options(layers, LAYER_WORDS)}
        onChange={({ target }) => {
          const what = layers.find((one) => one === target.value);
          const fresh = what === 'no_shoot' ? { sector: { fromDeg: 0, toDeg: 90, reachM: 200 } } : {};
          if (what) onChange({ ...thing, what, props: what === thing.what ? thing.props : fresh }, null);
        }}
      />
      {thing.what === 'wood' && (
        <NumberInput
          label={THING_FIELD_WORDS.timberCutIn}
          optional
          hint={THING_FIELD_WORDS.timberCutInHint}
          min={1900}
          max={2200}
          value={thing.props.cutYear ?? ''}
          onChange={({ target }) => {
            const year = Number(target.value);
            const { cutYear: _, ...rest } = thing.props;
            onChange(
              { ...thing, props: Number.isInteger(year) && year > 0 ? { ...rest, cutYear: year } : rest },
              `cut:${thing.id}`,
            );
          }}
        />
      )}
      {thing.what === 'camera' && (
        <NumberInput
          label={THING_FIELD_WORDS.looksToward}
          optional
          unit="°"
          hint={THING_FIELD_WORDS.looksTowardHint}
          min={0}
          max={360}
          defaultValue={thing.props.facingDeg ?? ''}
          onChange={({ target }) => {
            const facingDeg = Number(target.value);
            const { facingDeg: _, ...rest } = thing.props;
            if (target.value !== '' && !(facingDeg >= 0 && facingDeg <= 360)) return;
            onChange({ ...thing, props: target.value === '' ? rest : { ...rest, facingDeg } }, `facing:${thing.id}`);
          }}
        />
      )}
      {thing.what === 'no_shoot' && sector && (
        <div className="grid grid-cols-3 gap-2">
          <NumberInput
            label={THING_FIELD_WORDS.from}
            unit="°"
            min={0}
            max={360}
            defaultValue={Math.round(sector.fromDeg)}
            onChange={({ target }) => turn('fromDeg', target.value, 360)}
          />
          <NumberInput
            label={THING_FIELD_WORDS.to}
            unit="°"
            min={0}
            max={360}
            defaultValue={Math.round(sector.toDeg)}
            onChange={({ target }) => turn('toDeg', target.value, 360)}
          />
          <NumberInput
            label={THING_FIELD_WORDS.reach}
            unit={us ? 'yd' : 'm'}
            min={1}
            max={2000}
            defaultValue={Math.round(us ? mToYd(sector.reachM) : sector.reachM)}
            onChange={({ target }) => turn('reachM', target.value, 2000, us ? ydToM(1) : 1)}
          />
        </div>
      )}
    </>
  );
}
