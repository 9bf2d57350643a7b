import { useEffect, useRef, useState } from 'react';

/**
 * Seconds spent on what is shown, counted on from `startAt`. The clock is the monotonic one, so that a
 * changed device clock cannot bend it, and it stands still while the page is hidden.
 * `onSecond` hears each whole second. Key the component by what is timed.
 */
export function useStopwatch(startAt: number, onSecond: (seconds: number) => void): number {
  const [seconds, setSeconds] = useState(startAt);
  const spent = useRef(startAt);
  const told = useRef(onSecond);
  useEffect(() => {
    told.current = onSecond;
  });
  useEffect(() => {
    let since: number | null = null;
    const settle = () => {
      if (since !== null) spent.current += (performance.now() - since) / 1000;
      since = document.hidden ? null : performance.now();
      return Math.floor(spent.current);
    };
    const tick = () => {
      const whole = settle();
      setSeconds(whole);
      told.current(whole);
    };
    settle();
    const timer = setInterval(tick, 1000);
    document.addEventListener('visibilitychange', tick);
    return () => {
      settle();
      clearInterval(timer);
      document.removeEventListener('visibilitychange', tick);
    };
  }, []);
  return seconds;
}
