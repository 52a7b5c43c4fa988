import { type RefObject, useCallback, useImperativeHandle, useLayoutEffect, useRef } from 'react';
import { joinName } from '../../../core/layout/joinWords.ts';
import type { Bar, Crossing, Layout } from '../../../core/layout/model.ts';
import { JoinGlyph } from '../../glyphs/JoinGlyph.tsx';
import { StatusGlyph } from '../../glyphs/StatusGlyph.tsx';
import type { BayViewProps } from '../bayViewProps.ts';
import type { OverlayMotion } from '../bowing/overlayMotion.ts';
import { useSwing } from '../bowing/useSwing.ts';
import { Detail } from '../detail/Detail.tsx';
import { ForceNodes } from '../forces/ForceNodes.tsx';
import type { Size } from '../useSize.ts';
import type { SheetView } from '../view/sheetView.ts';
import { InkPainter } from './inkPainter.ts';
import type { OverlayContent } from './overlayContent.ts';
import { layOutOverlay, type OverlayLayout } from './overlayLayout.ts';
import { useBowGrowth } from './useBowGrowth.ts';

/** Lets the camera tell the overlay that the view has moved, without a render. */
export interface OverlayHandle {
  show(view: SheetView): void;
}

export type OverlayProps = BayViewProps & {
  readonly content: OverlayContent;
  readonly moves: OverlayMotion;
  readonly handle: RefObject<OverlayHandle | null>;
  readonly legend: Size;
};

/**
 * Everything that lies over the steel: the drawing's ink, and real buttons for crossings, ends and labels. React makes them; their places
 * are written straight to the page whenever the view moves.
 */
export function Overlay(props: OverlayProps) {
  const { content, moves, handle, assessment, units, trail, legend, stiffness, removed, playing, forces } =
    props;
  const figure = props.figure !== null;
  const root = useRef<HTMLDivElement>(null);
  const ink = useRef<SVGGElement>(null);
  const frame = useRef<SVGGElement>(null);
  const faces = useRef<SVGGElement>(null);
  const painter = useRef<InkPainter | null>(null);
  const facePainter = useRef<InkPainter | null>(null);
  const detailAt = useRef<number | null>(null);
  const view = useRef<SheetView | null>(null);
  const candidates = useRef<ReadonlyMap<string, number>>(new Map());
  const latest = useRef({
    content,
    moves,
    assessment,
    units,
    trail,
    legend,
    stiffness,
    removed,
    figure,
    forces,
  });
  latest.current = { content, moves, assessment, units, trail, legend, stiffness, removed, figure, forces };
  const bowed =
    moves.key !== null || content.bow === null || content.selected === null
      ? moves.key
      : `${content.selected.id} ${content.bow.from} ${content.bow.to} ${content.bow.direction.join(' ')}`;

  const step = useRef<() => void>(() => {});
  const grown = useBowGrowth(bowed, step);
  const swings = playing && moves.motion?.kind === 'shape';
  const swing = useSwing(swings, step);

  const repaint = useCallback(() => {
    if (view.current === null || root.current === null || ink.current === null) return;
    painter.current ??= new InkPainter(ink.current);
    const laid = layOutOverlay({
      view: view.current,
      ...latest.current,
      grown: swings ? swing.current : grown.current,
      sizes: labelSizes(root.current),
      previous: candidates.current,
      previousDetail: detailAt.current,
    });
    candidates.current = laid.candidates;
    painter.current.paint(laid.ink);
    putInPlace(root.current, laid);
    if (frame.current === null || faces.current === null) return;
    facePainter.current ??= new InkPainter(faces.current);
    facePainter.current.paint(laid.detail?.faces ?? []);
    if (!latest.current.figure) detailAt.current = laid.detail?.place ?? null;
    // Not by visibility, which children take up a frame late: the disc would stand empty for a moment.
    frame.current.style.display = laid.detail ? '' : 'none';
    if (laid.detail) frame.current.setAttribute('transform', `translate(${laid.detail.at.join(' ')})`);
  }, [grown, swing, swings]);
  step.current = repaint;

  useImperativeHandle(
    handle,
    () => ({
      show(moved) {
        view.current = moved;
        repaint();
      },
    }),
    [repaint],
  );
  // What is shown has changed under a view that stands still.
  // biome-ignore lint/correctness/useExhaustiveDependencies: the values are read from `latest` at the time of painting
  useLayoutEffect(repaint, [
    content,
    moves,
    assessment,
    units,
    trail,
    legend,
    stiffness,
    removed,
    figure,
    forces,
    repaint,
  ]);

  return (
    <div ref={root} className="scene-overlay">
      <svg className="scene-ink" aria-hidden="true" focusable="false">
        <g ref={ink} />
        <Detail frame={frame} faces={faces} />
      </svg>
      {props.figure !== null && (
        <div className="scene-figure" data-place="figure">
          {props.figure}
        </div>
      )}
      <Crossings {...props} />
      <Labels {...props} />
      {props.forces === null && <Ends {...props} />}
      {props.forces?.placing != null && content.bay !== null && (
        <ForceNodes
          placing={props.forces.placing}
          units={units}
          right={content.bay.planes[0]?.right ?? [1, 0, 0]}
          view={view}
          onForce={props.onForce}
        />
      )}
    </div>
  );
}

function Crossings({ content, assessment, selectedCrossing, onSelectCrossing }: OverlayProps) {
  return content.crossings.map((crossing) => (
    <button
      key={crossing.id}
      type="button"
      className="scene-crossing"
      data-crossing={crossing.id}
      data-place={`crossing ${crossing.id}`}
      aria-label={crossingName(assessment.layout, crossing)}
      aria-pressed={crossing.id === selectedCrossing}
      title={crossingName(assessment.layout, crossing)}
      onClick={() => onSelectCrossing(crossing.id)}
    >
      <JoinGlyph join={crossing.join?.kind ?? 'unmarked'} />
    </button>
  ));
}

function Labels({ content, selectedBar, hoveredBar, onSelectBar, onHoverBar }: OverlayProps) {
  return content.diagonals.map(({ bar, label }) => (
    <button
      key={bar.id}
      type="button"
      className={bar.id === hoveredBar ? 'scene-label hovered' : 'scene-label'}
      data-bar-label={bar.id}
      data-place={`label ${bar.id}`}
      aria-label={label.spoken}
      aria-pressed={bar.id === selectedBar}
      onClick={() => onSelectBar(bar.id)}
      onPointerEnter={() => onHoverBar(bar.id)}
      onPointerLeave={() => onHoverBar(null)}
    >
      <b>{label.mark}</b>
      <StatusGlyph status={label.status} />
      <span>{label.slenderness}</span>
    </button>
  ));
}

function Ends({ content, selectedBar, onSelectEnd }: OverlayProps) {
  return content.diagonals.flatMap(({ bar }) =>
    (['i', 'j'] as const).map((end) => (
      <button
        key={`${bar.id}:${end}`}
        type="button"
        className={bar.id === selectedBar ? 'scene-end chosen' : 'scene-end'}
        data-end={`${bar.id}:${end}`}
        data-place={`end ${bar.id}:${end}`}
        aria-label={endName(bar, end)}
        title={endName(bar, end)}
        // Two stops for every bar would make the bay long to walk through by keys: only the selected bar's ends are stops.
        tabIndex={bar.id === selectedBar ? 0 : -1}
        onClick={() => onSelectEnd(bar.id, end)}
      >
        <span className="scene-end-tick" aria-hidden="true" />
        {bar.id === selectedBar && (
          <span className="scene-end-letter" aria-hidden="true">
            {end}
          </span>
        )}
      </button>
    )),
  );
}

/** "Crossing D1 × D2, bolted through". */
export function crossingName(layout: Layout, crossing: Crossing): string {
  const mark = (id: Bar['id']): string => layout.bars.get(id)?.mark ?? id;
  return `Crossing ${mark(crossing.a)} × ${mark(crossing.b)}, ${joinName(crossing.join)}`;
}

function endName(bar: Bar, end: 'i' | 'j'): string {
  return `End ${end} of ${bar.mark}`;
}

function labelSizes(
  root: HTMLElement,
): ReadonlyMap<string, { readonly width: number; readonly height: number }> {
  const sizes = new Map<string, { readonly width: number; readonly height: number }>();
  for (const element of root.querySelectorAll<HTMLElement>('[data-bar-label]')) {
    const key = element.dataset.barLabel;
    if (key !== undefined) sizes.set(key, { width: element.offsetWidth, height: element.offsetHeight });
  }
  return sizes;
}

function putInPlace(root: HTMLElement, laid: OverlayLayout): void {
  for (const element of root.querySelectorAll<HTMLElement>('[data-place]')) {
    const place = laid.places.get(element.dataset.place ?? '');
    // Hidden from the eye, the pointer and the keys alike.
    const visibility = place ? '' : 'hidden';
    if (element.style.visibility !== visibility) element.style.visibility = visibility;
    if (!place) continue;
    element.style.transform = `translate(${place.x.toFixed(1)}px, ${place.y.toFixed(1)}px)`;
    if (place.ring !== undefined) element.style.setProperty('--ring', `${place.ring}px`);
    if (place.turn !== undefined) element.style.setProperty('--turn', `${place.turn.toFixed(1)}deg`);
  }
}
