'use client';
import 'reactflow/dist/base.css';
import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
import { ConnectionMode, ReactFlow, ReactFlowProvider, useReactFlow, ViewportPortal, type Viewport } from 'reactflow';
import { drawingBounds } from '@/components/drawing/drawing-bounds';
import { isHot, netOfLines } from '@/components/drawing/hot-wires';
import { placeLabels } from '@/components/drawing/label-places';
import { ReadingGeometry } from '@/components/drawing/reading-geometry';
import { TitleBlock, type TitleCell } from '@/components/drawing/title-block';
import { ZoomKeys } from '@/components/drawing/zoom-keys';
import type { SheetGeometry } from '@/components/margin/sheet-geometry';
import type { Editor } from '@/lib/editor/editor';
import type { EditorState } from '@/lib/editor/editor-state';
import { spokenItems } from '@/lib/editor/spoken/part-spoken';
import type { PresenceEntry } from '@/realtime/presence-fields';
import { AskingBox } from './asking-box';
import { CanvasGrid } from './canvas-grid';
import { CanvasProvider, useEditorValue } from './canvas-context';
import { edgesOf, nodesOf } from './flow-records';
import { GestureOverlay } from './gesture-overlay';
import { HotTags } from './hot-tags';
import { JunctionNodeView } from './junction-node';
import { PartNodeView } from './part-node';
import { PresenceOverlay } from './presence-overlay';
import { frameBoxOf } from './sheet-frame-box';
import { useCanvasKeys } from './use-canvas-keys';
import { useCanvasPointer } from './use-canvas-pointer';
import { useCanvasView } from './use-canvas-view';
import { useChosenInView } from './use-chosen-in-view';
import { WireEdgeView } from './wire-edge';
import { ZoneRulers } from './zone-rulers';

const nodeTypes = { part: PartNodeView, junction: JunctionNodeView };
const edgeTypes = { wire: WireEdgeView };
const noParts: ReadonlySet<string> = new Set();

export interface SheetCanvasProps {
  readonly editor: Editor;
  readonly state: EditorState;
  /** Name of the drawing for screen readers. */
  readonly label: string;
  /** Volts of each net at the hold point shown; nets above the touch-safe limit are drawn as double rails. */
  readonly volts?: Readonly<Record<string, number>>;
  /** Parts lit from the margin, by id. */
  readonly lit?: ReadonlySet<string>;
  readonly others?: readonly PresenceEntry[];
  /** Said in the corner of the sheet: 'Shown at 36 V'. */
  readonly shown?: string | undefined;
  readonly titleBlock: readonly TitleCell[];
  readonly zigzag?: boolean;
  /** Told where the pointer is, in sheet units; null when it leaves. */
  readonly onCursor?: (at: { readonly x: number; readonly y: number } | null) => void;
  /** Gets the geometry that the margin asks; null when the canvas goes. */
  readonly onGeometry?: (geometry: SheetGeometry | null) => void;
}

/** The sheet to edit: drafting film, symbols, wires, and the tool in hand. Runs on any document, shared or not. */
export function SheetCanvas(props: SheetCanvasProps) {
  return <ReactFlowProvider><Canvas {...props} /></ReactFlowProvider>;
}

function Canvas({ editor, state, label, volts = {}, lit = noParts, others = [], shown, titleBlock, zigzag = false, onCursor, onGeometry }: SheetCanvasProps) {
  const { sheet } = state;
  const root = useRef<HTMLDivElement>(null);
  const flow = useReactFlow();
  const labels = useMemo(() => new Map(placeLabels(sheet).map((one) => [one.part, one])), [sheet]);
  const frame = useMemo(() => frameBoxOf(sheet.parts.length + sheet.wires.length === 0 ? null : drawingBounds(sheet, 0)), [sheet]);
  const nets = useMemo(() => netOfLines(sheet), [sheet]);
  const shownSheet = useEditorValue(editor, (now) => now.shown);
  const nodes = useMemo(() => nodesOf(shownSheet, spokenItems(sheet)), [shownSheet, sheet]);
  const edges = useMemo(() => edgesOf(sheet, spokenItems(sheet), nets, (net) => isHot(volts[net])), [sheet, nets, volts]);
  const cursorTold = useCallback((at: { readonly x: number; readonly y: number } | null) => onCursor?.(at), [onCursor]);
  const pointer = useCanvasPointer(editor, cursorTold);
  const keys = useCanvasKeys(editor);
  const view = useCanvasView(editor, frame, root);
  useChosenInView(editor, root);
  const [geometry] = useState(() => new ReadingGeometry(sheet, frame, { x: 0, y: 0, scale: 1 }, { width: 0, height: 0 }, (point) => { void flow.setCenter(point.x, point.y, { zoom: flow.getZoom() }); }));

  useEffect(() => {
    onGeometry?.(geometry);
    return () => onGeometry?.(null);
  }, [geometry, onGeometry]);
  useEffect(() => { geometry.drawn(shownSheet, frame); }, [geometry, shownSheet, frame]);
  const tellView = useCallback((_: unknown, { x, y, zoom }: Viewport) => {
    geometry.moved({ scale: zoom, x: (-x - insetLeft) / zoom, y: (-y - insetTop) / zoom }, { width: view.width + insetLeft + 10, height: view.height + insetTop + 46 });
  }, [geometry, view.width, view.height]);
  useEffect(() => { tellView(null, flow.getViewport()); }, [tellView, flow]);

  // The flow calls itself an application; one is enough, and this one has the name and the keys.
  useEffect(() => root.current?.querySelector('.react-flow')?.setAttribute('role', 'presentation'), []);

  const context = useMemo(() => ({ editor, labels, zigzag, lit }), [editor, labels, zigzag, lit]);
  const back = useCallback(() => root.current?.focus(), []);
  return (
    <div className="relative flex min-w-0 flex-1 flex-col bg-film pt-6 pr-2.5 pb-2.5 pl-6 max-tablet:p-0">
      <div
        ref={root}
        {...keys}
        {...pointer}
        tabIndex={0}
        role="application"
        aria-label={label}
        aria-roledescription="schematic"
        data-tool={state.tool}
        className="sheet-canvas relative min-h-0 flex-1 border-[1.5px] border-ink outline-none [&_.react-flow\_\_edge:focus-visible_path]:stroke-act [&_.react-flow\_\_node:focus-visible]:outline-2 [&_.react-flow\_\_node:focus-visible]:outline-offset-4 [&_.react-flow\_\_node:focus-visible]:outline-act focus-visible:outline-2 focus-visible:outline-offset-2 focus-visible:outline-act max-tablet:border-0 print:min-h-[520px]"
      >
        <CanvasProvider value={context}>
          <ReactFlow
            nodes={nodes as never}
            edges={edges as never}
            nodeTypes={nodeTypes}
            edgeTypes={edgeTypes}
            connectionMode={ConnectionMode.Loose}
            onlyRenderVisibleElements
            nodesDraggable={false}
            nodesConnectable={false}
            elementsSelectable={false}
            nodesFocusable
            edgesFocusable
            disableKeyboardA11y
            deleteKeyCode={null}
            selectionKeyCode={null}
            multiSelectionKeyCode={null}
            panActivationKeyCode={null}
            zoomActivationKeyCode={null}
            panOnDrag={[1, 2]}
            zoomOnDoubleClick={false}
            minZoom={0.1}
            maxZoom={4}
            onMove={tellView}
            proOptions={{ hideAttribution: true }}
          >
            <CanvasGrid frame={frame} />
            <ViewportPortal>
              <HotTags sheet={sheet} edges={edges} volts={volts} />
              <PresenceOverlay others={others} sheet={sheet} />
              <GestureOverlay editor={editor} zigzag={zigzag} />
            </ViewportPortal>
            <AskingBox editor={editor} onDone={back} />
          </ReactFlow>
        </CanvasProvider>
        <p role="status" className="sr-only">{state.message}</p>
        <ZoneRulers frame={frame} width={view.width} height={view.height} />
        {shown ? <p className="silk pointer-events-none absolute top-3.5 left-4 bg-film text-act max-tablet:hidden">{shown}</p> : null}
      </div>
      <div data-not-canvas><ZoomKeys scale={view.zoom} onZoom={view.zoomBy} onFit={view.fit} /></div>
      <TitleBlock cells={titleBlock} />
    </div>
  );
}

const insetLeft = 24;
const insetTop = 24;
