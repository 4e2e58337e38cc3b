import { useEffect, useState } from 'react';

/** The value once it has stood still for so long: for what is read aloud, which should not chatter with each key. */
export function useStill<T>(value: T, milliseconds: number): T {
  const [still, setStill] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setStill(value), milliseconds);
    return () => clearTimeout(timer);
  }, [value, milliseconds]);
  return still;
}
