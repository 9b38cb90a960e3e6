import { useEffect } from 'react';
import { NavigationType, useLocation, useNavigationType } from 'react-router';

const places = new Map<string, number>();
const mostWaitMs = 2_000;

/** A new page begins at its top; Back comes to where one was, once the page is tall enough again. */
export function useScrollMemory(): void {
  const { key, pathname } = useLocation();
  const kind = useNavigationType();
  useEffect(() => {
    window.history.scrollRestoration = 'manual';
    const remember = () => places.set(key, window.scrollY);
    window.addEventListener('scroll', remember, { passive: true });
    return () => window.removeEventListener('scroll', remember);
  }, [key]);
  useEffect(() => {
    const wanted = kind === NavigationType.Pop ? (places.get(key) ?? 0) : 0;
    if (wanted === 0) {
      window.scrollTo(0, 0);
      return undefined;
    }
    const until = Date.now() + mostWaitMs;
    let frame = 0;
    const come = () => {
      window.scrollTo(0, wanted);
      if (window.scrollY < wanted - 1 && Date.now() < until) frame = requestAnimationFrame(come);
    };
    come();
    return () => cancelAnimationFrame(frame);
    // A change of the query alone is the same page: it stays where it is.
    // oxlint-disable-next-line react/exhaustive-deps
  }, [pathname]);
}
