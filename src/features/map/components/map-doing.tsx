'use client';

import { FEATURE_KIND_WORDS, STAND_KIND_WORDS } from '@/features/ground/words';
import { Button } from '@/ui/button';
import type { NewKind } from '../drawing/kinds';
import type { MapThing, MapView } from '../thing';
import { KIND_WORDS, LAYER_WORDS, nameOf } from '../words';
import { DrawBar, DrawingBar } from './draw-bar';
import { HerePanel } from './here-panel';
import { MeasurePanel } from './measure-panel';
import type { MapEditor } from './use-map-editor';

export function kindWords(kind: NewKind): string {
  switch (kind.kind) {
    case 'stand':
      return STAND_KIND_WORDS[kind.what];
    case 'feature':
      return FEATURE_KIND_WORDS[kind.what];
    case 'item':
      return LAYER_WORDS[kind.what];
    default:
      return KIND_WORDS[kind.kind];
  }
}

const HOW = {
  point: 'tap where it is.',
  line: 'tap from point to point; tap the last one again to end.',
  area: 'tap its corners one after another; tap the first one again to close it.',
} as const;

/** The bar over the map for whatever the hand is doing. */
export function MapDoing({ view, editor, things }: { view: MapView; editor: MapEditor; things: readonly MapThing[] }) {
  const { doing, progress, corner } = editor;
  const { club } = view;
  const bar = {
    club,
    shape: progress,
    onFinish: () => editor.map.current?.finish(),
    onUndoPoint: () => editor.map.current?.undoPoint(),
    onCancel: editor.stop,
  };
  switch (doing.mode) {
    case 'add': {
      const from = doing.kind.kind === 'approach' ? 'from the parking place to the stand, ' : '';
      return (
        <DrawingBar
          {...bar}
          line={doing.shape !== 'point'}
          title={`${kindWords(doing.kind)}: ${from}${HOW[doing.shape]}`}
        />
      );
    }
    case 'split':
      return (
        <DrawingBar
          {...bar}
          line={doing.shape === 'area'}
          title={
            doing.shape === 'area' ? 'Split: draw a line right across it.' : 'Split: tap the line where it is to part.'
          }
        />
      );
    case 'reshape': {
      const thing = things.find((one) => one.id === doing.id);
      const how =
        thing?.geometry.type === 'Point'
          ? 'drag it'
          : 'drag its corners, or the small dots between them, or the whole of it';
      return (
        <DrawBar club={club} shape={progress} title={`${thing ? nameOf(thing) : 'Reshape'}: ${how}.`}>
          {corner && <Button onClick={() => editor.takeOut(corner)}>Take out this corner</Button>}
          <Button look="primary" onClick={editor.stop}>
            Done
          </Button>
        </DrawBar>
      );
    }
    case 'here': {
      const { here } = editor;
      return (
        <HerePanel
          club={club}
          what={kindWords(doing.kind)}
          here={here}
          onHere={editor.setHere}
          onDrop={() => here && editor.add(doing.kind, { type: 'Point', coordinates: here.at })}
          onCancel={editor.stop}
        />
      );
    }
    case 'measure':
      return (
        <MeasurePanel
          view={view}
          things={things}
          points={editor.measured}
          onPoints={editor.setMeasured}
          onClose={editor.stop}
        />
      );
    default:
      return null;
  }
}
