import { useEffect, useRef } from 'react';
import { useLocation, useNavigate } from 'react-router-dom';
import { useSignOut } from '../features/session/mutations';
import { createInputClock, setScreenLocking } from '../lib/screen-lock';
import { buildSignInPath } from '../paths';

const inputs = ['pointerdown', 'keydown', 'wheel', 'touchstart'] as const;
const lookEveryMs = 15_000;

const openStorage = () => {
  try {
    return window.localStorage;
  } catch {
    return null;
  }
};

/** Signs out where nobody has touched the screen for a while; whoever comes next goes on at the same place. */
export function useIdleLock(): void {
  const { mutateAsync: signOut } = useSignOut();
  const navigate = useNavigate();
  const location = useLocation();
  const here = useRef('');
  useEffect(() => {
    here.current = location.pathname + location.search;
  }, [location]);

  useEffect(() => {
    const clock = createInputClock(openStorage(), Date.now);
    const touch = () => clock.touch();
    touch();
    const lock = async () => {
      setScreenLocking(true);
      // Without an answer the page is left all the same: what is on the screen must go.
      await signOut().catch(() => undefined);
      await navigate(buildSignInPath(here.current), { replace: true });
      setScreenLocking(false);
    };
    const timer = window.setInterval(() => {
      if (clock.isIdle()) {
        window.clearInterval(timer);
        void lock();
      }
    }, lookEveryMs);
    for (const input of inputs) window.addEventListener(input, touch, { passive: true, capture: true });
    return () => {
      window.clearInterval(timer);
      for (const input of inputs) window.removeEventListener(input, touch, { capture: true });
    };
  }, [signOut, navigate]);
}
