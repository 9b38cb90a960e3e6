import { useEffect, useRef } from 'react';

const pauseMs = 2_000;

/** Share of the text that is above the lower edge of the window, 0 to 1. */
export function placeIn(text: Pick<DOMRect, 'top' | 'height'>, windowHeight: number): number {
  if (text.height <= 0) return 0;
  return Math.min(Math.max((windowHeight - text.top) / text.height, 0), 1);
}

/** Tells where the reader is in the text, once scrolling has paused and when the page is left. */
export function useReadingPlace(onPlace: (place: number) => void) {
  const text = useRef<HTMLElement>(null);
  const tell = useRef(onPlace);
  useEffect(() => {
    tell.current = onPlace;
  }, [onPlace]);
  useEffect(() => {
    let timer: number | undefined;
    let last = -1;
    const look = () => {
      // While the text is still being fetched there is no place in it.
      if (!text.current || text.current.offsetHeight < window.innerHeight / 2) return;
      const place = Number(placeIn(text.current.getBoundingClientRect(), window.innerHeight).toFixed(3));
      if (Math.abs(place - last) < 0.01) return;
      last = place;
      tell.current(place);
    };
    const scrolled = () => {
      window.clearTimeout(timer);
      timer = window.setTimeout(look, pauseMs);
    };
    scrolled();
    window.addEventListener('scroll', scrolled, { passive: true });
    document.addEventListener('visibilitychange', look);
    return () => {
      window.clearTimeout(timer);
      look();
      window.removeEventListener('scroll', scrolled);
      document.removeEventListener('visibilitychange', look);
    };
  }, []);
  return text;
}
