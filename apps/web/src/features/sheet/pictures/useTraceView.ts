import { useEffect, useRef, useState, type KeyboardEvent, type PointerEvent } from 'react';
import { traceWindows, type TraceBand } from './pairTraceLayout';
import { panned, wholeViewMs, zoomed, type TraceView } from './traceView';

const keyFactors: Record<string, number> = { '+': 0.7, '=': 0.7, '-': 1 / 0.7 };

/** Wider, a point a pixel could no longer show every frequency. */
const widestMs: Record<TraceBand, number> = { low: wholeViewMs, every: 12 };

const middle = ({ fromMs, toMs }: TraceView) => (fromMs + toMs) / 2;
const spanOf = ({ fromMs, toMs }: TraceView) => toMs - fromMs;

/**
 * Zoom and pan of the pair trace: Ctrl and wheel or a pinch zoom, a drag or a sideways wheel moves, + − 0 and Shift with
 * the arrows do both by key. A plain wheel scrolls the page.
 */
export function useTraceView(band: TraceBand, widthPx: number) {
  const [kept, setKept] = useState<{ band: TraceBand; view: TraceView }>({ band, view: traceWindows[band] });
  const view = kept.band === band ? kept.view : traceWindows[band];
  const surface = useRef<HTMLDivElement>(null);
  const zoom = (v: TraceView, atMs: number, factor: number) =>
    zoomed(v, { atMs, factor, widest: widestMs[band] });
  const change = (next: (view: TraceView) => TraceView) => setKept({ band, view: next(view) });
  const msAt = (clientX: number) => {
    const left = surface.current?.getBoundingClientRect().left ?? 0;
    return view.fromMs + ((clientX - left) / widthPx) * spanOf(view);
  };
  useWheel(surface, (event) => {
    const sideways = Math.abs(event.deltaX) > Math.abs(event.deltaY);
    if (!event.ctrlKey && !sideways) return;
    event.preventDefault();
    if (event.ctrlKey) change((v) => zoom(v, msAt(event.clientX), Math.exp(event.deltaY / 300)));
    else change((v) => panned(v, (event.deltaX / widthPx) * spanOf(v)));
  });
  const pointers = usePointers({ msPerPx: spanOf(view) / widthPx, msAt, change, zoom });
  const onKeyDown = (event: KeyboardEvent) => {
    const way = event.key === 'ArrowRight' ? 1 : event.key === 'ArrowLeft' ? -1 : 0;
    const factor = keyFactors[event.key];
    if (event.key === '0') setKept({ band, view: traceWindows[band] });
    else if (factor) change((v) => zoom(v, middle(v), factor));
    else if (event.shiftKey && way !== 0) change((v) => panned(v, way * spanOf(v) * 0.2));
    else return;
    event.preventDefault();
  };
  return {
    view,
    moved: view !== traceWindows[band],
    reset: () => setKept({ band, view: traceWindows[band] }),
    zoomBy: (factor: number) => change((v) => zoom(v, middle(v), factor)),
    surface: { ref: surface, onKeyDown, ...pointers },
  };
}

/** React's own wheel handler can't keep the page from zooming. */
function useWheel(surface: React.RefObject<HTMLElement | null>, onWheel: (event: WheelEvent) => void) {
  useEffect(() => {
    const element = surface.current;
    if (!element) return;
    element.addEventListener('wheel', onWheel, { passive: false });
    return () => element.removeEventListener('wheel', onWheel);
  });
}

interface PointerOptions {
  msPerPx: number;
  msAt: (clientX: number) => number;
  change: (next: (view: TraceView) => TraceView) => void;
  zoom: (view: TraceView, atMs: number, factor: number) => TraceView;
}

/** One pointer moves the view, two pinch it. */
function usePointers({ msPerPx, msAt, change, zoom }: PointerOptions) {
  const down = useRef(new Map<number, number>());
  const lift = (event: PointerEvent) => void down.current.delete(event.pointerId);
  return {
    onPointerDown: (event: PointerEvent) => {
      event.currentTarget.setPointerCapture(event.pointerId);
      down.current.set(event.pointerId, event.clientX);
    },
    onPointerMove: (event: PointerEvent) => {
      const before = down.current.get(event.pointerId);
      if (before === undefined) return;
      const other = [...down.current].find(([id]) => id !== event.pointerId)?.[1];
      down.current.set(event.pointerId, event.clientX);
      if (other === undefined) change((view) => panned(view, (before - event.clientX) * msPerPx));
      else {
        const factor = Math.abs(before - other) / Math.max(8, Math.abs(event.clientX - other));
        change((view) => zoom(view, msAt((event.clientX + other) / 2), factor));
      }
    },
    onPointerUp: lift,
    onPointerCancel: lift,
  };
}
