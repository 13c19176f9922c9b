import { computed, ref, shallowRef, type Ref } from 'vue';
import type { MapSheet } from '../../src/figure/mapSheet.js';
import type { Point } from '../../src/figure/point.js';
import type { MapPoint } from '../../src/sizing/mapScale.js';
import { useTrial, type TriedTube } from '../stores/trial.js';
import { snapped, stepped } from './snap.js';

/** How far the pointer goes with its key down before it drags, px. */
const DRAGS = 3;
/** Steps of an arrow key with Shift. */
const STRIDE = 10;

const ARROWS: Readonly<Record<string, readonly [outer: number, wall: number]>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowDown: [0, -1],
  ArrowUp: [0, 1],
};

/** What the hand works on. */
export interface Bench {
  readonly material: string;
  readonly sheet: MapSheet;
  /** where the keys begin */
  readonly start: MapPoint;
  /** sizes that can be had; null where any can */
  readonly stock: readonly MapPoint[] | null;
}

/**
 * The hand on the map. The pointer looks; with its key down it tries the tubes that it goes over; a click takes the tube
 * under it in hand. Arrow keys move the tube on trial by a step, Enter takes it in hand, Esc lets it go.
 */
export function useHand(bench: Readonly<Ref<Bench | null>>) {
  const trial = useTrial();
  const pointer = shallowRef<Point | null>(null);
  const from = shallowRef<Point | null>(null);
  const dragging = ref(false);

  /** The tube on trial, where it is of this material. */
  const tried = computed(() => (trial.tube?.material === bench.value?.material ? trial.tube : null));

  function placeOf(event: PointerEvent, sheet: MapSheet): Point {
    const box = (event.currentTarget as Element).getBoundingClientRect();
    const scale = box.width > 0 ? sheet.width / box.width : 1;
    return { x: (event.clientX - box.left) * scale, y: (event.clientY - box.top) * scale };
  }

  function tubeAt(place: Point, { material, sheet, stock }: Bench): TriedTube | null {
    const tube = snapped(sheet.tubeAt(place), sheet.axes, stock);
    return tube === null ? null : { material, ...tube };
  }

  function attempt(tube: TriedTube | null): void {
    if (tube !== null) void trial.attempt(tube);
  }

  function down(event: PointerEvent): void {
    const own = bench.value;
    if (own === null || event.button !== 0) return;
    const place = placeOf(event, own.sheet);
    if (own.sheet.holds(place)) from.value = place;
  }

  function move(event: PointerEvent): void {
    const own = bench.value;
    if (own === null) return;
    const place = placeOf(event, own.sheet);
    pointer.value = own.sheet.holds(place) ? place : null;
    if (from.value === null) return;
    if (!dragging.value && Math.hypot(place.x - from.value.x, place.y - from.value.y) > DRAGS) {
      dragging.value = true;
      (event.currentTarget as Element).setPointerCapture(event.pointerId);
    }
    if (dragging.value && pointer.value !== null) attempt(tubeAt(place, own));
  }

  function up(event: PointerEvent): void {
    const own = bench.value;
    const clicked = own !== null && from.value !== null && !dragging.value;
    from.value = null;
    dragging.value = false;
    const tube = clicked ? tubeAt(placeOf(event, own.sheet), own) : null;
    if (tube !== null && trial.available) void trial.hold(tube);
  }

  function leave(): void {
    pointer.value = null;
  }

  function cancel(): void {
    from.value = null;
    dragging.value = false;
    pointer.value = null;
  }

  function walk(direction: readonly [number, number], own: Bench): void {
    const begun = tried.value ?? own.start;
    attempt({ material: own.material, ...stepped(begun, direction, own.sheet.axes, own.stock) });
  }

  function key(event: KeyboardEvent): void {
    const own = bench.value;
    if (own === null || event.altKey || event.ctrlKey || event.metaKey) return;
    const arrow = ARROWS[event.key];
    const times = event.shiftKey ? STRIDE : 1;
    if (arrow !== undefined) walk([arrow[0] * times, arrow[1] * times], own);
    else if (event.key === 'Escape') trial.end();
    else if (event.key === 'Enter' && tried.value !== null && trial.available) void trial.hold(tried.value);
    else return;
    event.preventDefault();
  }

  return { pointer, dragging, tried, down, move, up, leave, cancel, key };
}
