import { useEffect, useState } from 'react';

/** True once the component has been there for so long: nothing flickers that is answered sooner. */
export function useAfter(milliseconds: number): boolean {
  const [passed, setPassed] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setPassed(true), milliseconds);
    return () => clearTimeout(timer);
  }, [milliseconds]);
  return passed;
}
