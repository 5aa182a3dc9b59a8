import { useEffect, useState } from 'react';

/** A hand that holds something still for so long is resting, ms. */
const rest = 150;

/** A value that changes at every frame while something is moving, seen when the hand rests or lets go. */
export function useCalm<T>(value: T, moving: boolean): T {
  const [calm, setCalm] = useState(value);
  useEffect(() => {
    if (!moving) {
      setCalm(value);
      return;
    }
    const timer = setTimeout(() => setCalm(value), rest);
    return () => clearTimeout(timer);
  }, [value, moving]);
  return moving ? calm : value;
}
