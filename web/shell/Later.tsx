import type { ComponentType } from 'preact';
import { useEffect, useState } from 'preact/hooks';

interface LaterProps {
  readonly load: () => Promise<ComponentType>;
}

/** A part of the page whose code is loaded once the page stands. */
export const Later = ({ load }: LaterProps) => {
  const [part, setPart] = useState<{ readonly Part: ComponentType } | null>(null);
  useEffect(() => {
    void load().then((Part) => setPart({ Part }));
  }, [load]);
  return part && <part.Part />;
};
