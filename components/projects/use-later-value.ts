import { useEffect, useState } from 'react';

/** `value`, but only once it has stood still for `delay` milliseconds: for searching while somebody types. */
export function useLaterValue<Value>(value: Value, delay: number): Value {
  const [later, setLater] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setLater(value), delay);
    return () => clearTimeout(timer);
  }, [value, delay]);
  return later;
}
