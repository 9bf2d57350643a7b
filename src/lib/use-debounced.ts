import { useEffect, useState } from 'react';

/** `value` as it was once it has stood still for `ms` milliseconds. */
export function useDebounced<Value>(value: Value, ms: number): Value {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), ms);
    return () => clearTimeout(timer);
  }, [value, ms]);
  return settled;
}
