'use client';

import { Maximize2, Redo2, Ruler, Undo2 } from 'lucide-react';
import { type ReactNode, useMemo, useState } from 'react';
import { ContourWords } from '@/features/terrain/components/contour-words';
import { contoursQuery } from '@/features/terrain/queries';
import { Button } from '@/ui/button';
import { Checkbox } from '@/ui/choices';
import { Notice } from '@/ui/notices';
import { useRead } from '@/ui/query';
import { Tabs } from '@/ui/tabs';
import type { MapOverlay } from '../overlay';
import { mapQuery } from '../queries';
import type { MapView } from '../thing';
import { MAP_SCREEN_WORDS } from '../words/screen';
import { AddPanel } from './add-panel';
import { ConflictDialog } from './conflict-dialog';
import { groupOf, LAYER_GROUPS, type LayerGroup, Legend } from './legend';
import { MapCanvas } from './map-canvas';
import { MapDoing } from './map-doing';
import { MapList } from './map-list';
import { mayChange, ThingCard } from './thing-card';
import { useDrawing } from './use-drawing';
import { useMapEditor } from './use-map-editor';
import { type SaveDrawing, useSaveDrawing } from './use-save-drawing';

export interface MapScreenProps {
  initial: MapView;
  save: SaveDrawing;
  /** Chosen when the screen opens. */
  selectedId: string | null;
  /** A second page of the list, and what it lays over the map. */
  moment?: {
    label: string;
    panel: ReactNode;
    overlay: MapOverlay | null;
    open: boolean;
    onOpen: (open: boolean) => void;
  };
}

const EVERYTHING: ReadonlySet<LayerGroup> = new Set(LAYER_GROUPS.map(({ value }) => value));

/** The club's ground: the map, the list that says the same, and the tools to draw it. */
export function MapScreen({ initial, save, selectedId, moment }: MapScreenProps) {
  const { slug } = initial.club;
  const query = useRead({ ...mapQuery(slug), initialData: initial, initialDataUpdatedAt: initial.madeAt });
  const view = query.data;
  const state = useDrawing(slug, view.things);
  const editor = useMapEditor(view, state, selectedId);
  const saving = useSaveDrawing(slug, state, save, editor.renamed);
  const [shown, setShown] = useState(EVERYTHING);
  const [imagery, setImagery] = useState(false);
  const [hills, setHills] = useState(false);
  const contours = useRead({ ...contoursQuery(slug), enabled: hills });
  const { things, changes } = state;
  const { selected, doing } = editor;
  const may = view.may.stands || view.may.features || view.may.approaches;
  const seen = useMemo(
    () => (shown.size === EVERYTHING.size ? things : things.filter((thing) => shown.has(groupOf(thing)))),
    [things, shown],
  );
  const turnable = doing.mode === 'look' && !moment?.open;
  const turning = useMemo(
    () =>
      selected?.kind === 'stand' && selected.geometry.type === 'Point' && turnable && mayChange(selected, view.may)
        ? { at: selected.geometry.coordinates, arcs: selected.arcs }
        : null,
    [selected, turnable, view.may],
  );
  const momentOverlay = moment?.open ? moment.overlay : null;
  const overlay = useMemo<MapOverlay>(
    () => ({
      ...momentOverlay,
      ...(hills && contours.data ? { contours: contours.data.lines } : {}),
      here: editor.here,
      ...(doing.mode === 'measure' ? { measured: [...editor.measured] } : {}),
    }),
    [momentOverlay, hills, contours.data, editor.here, editor.measured, doing.mode],
  );

  const list = (
    <>
      {selected && (
        <div className="mb-4">
          <ThingCard
            thing={selected}
            things={things}
            view={view}
            onChange={editor.put}
            onReshape={() => editor.begin({ mode: 'reshape', id: selected.id, round: 0 })}
            onSplit={() =>
              editor.begin({
                mode: 'split',
                id: selected.id,
                shape: selected.geometry.type === 'LineString' ? 'line' : 'area',
              })
            }
            onRemove={() => editor.remove(selected.id)}
            onClose={() => editor.select(null)}
          />
        </div>
      )}
      {may && (
        <AddPanel
          view={view}
          onDraw={(kind, shape) => editor.begin({ mode: 'add', kind, shape })}
          onHere={(kind) => editor.begin({ mode: 'here', kind })}
          onPlaces={editor.add}
        />
      )}
      <Legend shown={shown} onShown={setShown} />
      <div className="mt-3">
        <MapList club={view.club} things={things} selectedId={editor.selectedId} onSelect={editor.choose} />
      </div>
    </>
  );

  return (
    <div className="grid gap-3">
      {state.brought && changes.length > 0 && (
        <Notice
          title={MAP_SCREEN_WORDS.draftTitle}
          actions={<Button onClick={() => state.restart(view.things)}>{MAP_SCREEN_WORDS.draftDrop}</Button>}
        >
          {MAP_SCREEN_WORDS.draftText}
        </Notice>
      )}
      {(saving.problem ?? editor.problem) && (
        <Notice live level="caution" title={saving.problem ?? editor.problem ?? ''} />
      )}
      <div className="flex flex-wrap items-center gap-2">
        <Button onClick={() => editor.map.current?.showAll()}>
          <Maximize2 aria-hidden="true" className="size-4" /> {MAP_SCREEN_WORDS.showAll}
        </Button>
        <Button aria-pressed={doing.mode === 'measure'} onClick={() => editor.begin({ mode: 'measure' })}>
          <Ruler aria-hidden="true" className="size-4" /> {MAP_SCREEN_WORDS.measure}
        </Button>
        {may && (
          <>
            <Button
              disabled={state.drawing.past.length === 0}
              onClick={() => {
                editor.stop();
                state.undo();
              }}
            >
              <Undo2 aria-hidden="true" className="size-4" /> {MAP_SCREEN_WORDS.undo}
            </Button>
            <Button
              disabled={state.drawing.future.length === 0}
              onClick={() => {
                editor.stop();
                state.redo();
              }}
            >
              <Redo2 aria-hidden="true" className="size-4" /> {MAP_SCREEN_WORDS.redo}
            </Button>
            <span className="grow" />
            {changes.length > 0 && (
              <Button
                look="primary"
                pending={saving.pending}
                pendingLabel={MAP_SCREEN_WORDS.saving}
                onClick={saving.save}
              >
                {MAP_SCREEN_WORDS.save(changes.length)}
              </Button>
            )}
          </>
        )}
        <Checkbox
          label={MAP_SCREEN_WORDS.contours}
          checked={hills}
          onChange={({ target }) => setHills(target.checked)}
        />
        {view.imagery && (
          <Checkbox
            label={MAP_SCREEN_WORDS.photographs}
            checked={imagery}
            onChange={({ target }) => setImagery(target.checked)}
          />
        )}
      </div>
      <div className="grid gap-4 lg:grid-cols-[minmax(0,1fr)_23rem]">
        <div className="grid content-start gap-2">
          <MapDoing view={view} editor={editor} things={things} />
          {hills && <ContourWords view={contours.data} error={contours.isError ? contours.error.message : null} />}
          <MapCanvas
            ref={editor.map}
            view={view}
            things={seen}
            label={MAP_SCREEN_WORDS.mapOf(view.club.name)}
            className="relative h-[58dvh] min-h-80 lg:h-[min(48rem,78dvh)]"
            tool={editor.tool}
            selectedId={editor.selectedId}
            overlay={overlay}
            imagery={imagery}
            turning={turning}
            onSelect={editor.select}
            onDrawn={editor.drawn}
            onReshaped={editor.reshaped}
            onProgress={editor.setProgress}
            onMeasure={(at) => editor.setMeasured([...editor.measured, at])}
            onTurn={editor.turn}
            onRefused={(message) => {
              editor.stop();
              editor.setProblem(message);
            }}
          />
        </div>
        <div className="min-w-0 lg:max-h-[min(52rem,84dvh)] lg:overflow-y-auto lg:pr-2">
          {moment ? (
            <Tabs
              label={MAP_SCREEN_WORDS.besideTheMap}
              tabs={[
                { id: 'list', label: MAP_SCREEN_WORDS.whatIsThere, content: list },
                { id: 'moment', label: moment.label, content: moment.panel },
              ]}
              value={moment.open ? 'moment' : 'list'}
              onValueChange={(id) => moment.onOpen(id === 'moment')}
            />
          ) : (
            list
          )}
        </div>
      </div>
      <ConflictDialog
        conflicts={saving.conflicts}
        changes={changes}
        pending={saving.pending}
        onSettle={saving.settle}
        onClose={saving.dropConflicts}
      />
    </div>
  );
}
