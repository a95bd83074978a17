'use client';

import { FEATURE_KIND_WORDS, STAND_KIND_WORDS } from '@/features/ground/words/kinds';
import { Button } from '@/ui/button';
import type { NewKind } from '../drawing/kinds';
import type { MapThing, MapView } from '../thing';
import { MAP_DOING_WORDS } from '../words/screen';
import { KIND_WORDS, LAYER_WORDS, nameOf } from '../words/things';
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
      const say = doing.kind.kind === 'approach' ? MAP_DOING_WORDS.addApproach : MAP_DOING_WORDS.add[doing.shape];
      return <DrawingBar {...bar} line={doing.shape !== 'point'} title={say(kindWords(doing.kind))} />;
    }
    case 'split':
      return (
        <DrawingBar
          {...bar}
          line={doing.shape === 'area'}
          title={doing.shape === 'area' ? MAP_DOING_WORDS.split : MAP_DOING_WORDS.splitLine}
        />
      );
    case 'reshape': {
      const thing = things.find((one) => one.id === doing.id);
      const say = thing?.geometry.type === 'Point' ? MAP_DOING_WORDS.reshapePoint : MAP_DOING_WORDS.reshape;
      return (
        <DrawBar club={club} shape={progress} title={say(thing ? nameOf(thing) : null)}>
          {corner && <Button onClick={() => editor.takeOut(corner)}>{MAP_DOING_WORDS.takeOut}</Button>}
          <Button look="primary" onClick={editor.stop}>
            {MAP_DOING_WORDS.done}
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
