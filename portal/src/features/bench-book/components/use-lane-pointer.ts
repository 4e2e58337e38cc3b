import { useState, type PointerEvent } from 'react';
import { dragged } from '../lanes/cursor';
import { MINUTE_PX } from '../lanes/lane-sizes';

interface Drag {
  lane: number;
  start: number;
  now: number;
}

/** Pressing a free place picks two hours there; dragging picks what was dragged over. The form does the same. */
export function useLanePointer(laneCount: number, onPick: (lane: number, from: number, to: number) => void) {
  const [drag, setDrag] = useState<Drag>();
  const minuteAt = (event: PointerEvent<HTMLElement>) =>
    (event.clientY - event.currentTarget.getBoundingClientRect().top) / MINUTE_PX;
  const laneAt = (event: PointerEvent<HTMLElement>) => {
    const { left, width } = event.currentTarget.getBoundingClientRect();
    return Math.min(laneCount - 1, Math.floor(((event.clientX - left) / width) * laneCount));
  };
  const finish = () => {
    if (!drag) return;
    const isPress = Math.abs(drag.now - drag.start) < PRESS_MINUTES;
    const from = Math.floor(drag.start / 30) * 30;
    const picked = isPress
      ? { from, to: Math.min(24 * 60, from + USUAL_MINUTES) }
      : dragged(drag.start, drag.now);
    setDrag(undefined);
    onPick(drag.lane, picked.from, picked.to);
  };
  const isDragged = drag && Math.abs(drag.now - drag.start) >= PRESS_MINUTES;
  return {
    drawn: isDragged ? { lane: drag.lane, ...dragged(drag.start, drag.now) } : undefined,
    handlers: {
      onPointerDown: (event: PointerEvent<HTMLElement>) => {
        // A finger scrolls the day; only its press counts, which arrives as a click on a phone.
        if (event.button !== 0) return;
        const minute = minuteAt(event);
        if (event.pointerType !== 'touch') event.currentTarget.setPointerCapture(event.pointerId);
        setDrag({ lane: laneAt(event), start: minute, now: minute });
      },
      onPointerMove: (event: PointerEvent<HTMLElement>) => {
        if (drag && event.pointerType !== 'touch') setDrag({ ...drag, now: minuteAt(event) });
      },
      onPointerUp: finish,
      onPointerCancel: () => setDrag(undefined),
    },
  };
}

const PRESS_MINUTES = 8;
const USUAL_MINUTES = 120;
