import { useEffect, useState } from 'react';

/** The time of day, moving on every half minute so that "a minute ago" does not stay. */
export function useNow(): Date {
  const [now, setNow] = useState(() => new Date());
  useEffect(() => {
    const timer = setInterval(() => setNow(new Date()), 30_000);
    return () => clearInterval(timer);
  }, []);
  return now;
}
