import { useEffect, useRef, useState } from 'react';
import { useLook } from '../look/useLook';
import { useWidth } from '../look/useWidth';
import type { FitPicture } from './drawFit';

/** The picture of a fit; the drawing code is fetched when the first fit is shown. */
export function FitPlot({ picture }: { readonly picture: Omit<FitPicture, 'width'> }) {
  const look = useLook();
  const frame = useRef<HTMLDivElement>(null);
  const width = useWidth(frame);
  const [failed, setFailed] = useState(false);
  useEffect(() => {
    if (width === 0) return undefined;
    let current = true;
    import('./drawFit').then(
      ({ drawFit }) => {
        if (current) frame.current?.replaceChildren(...drawFit({ ...picture, width }));
      },
      () => {
        if (current) setFailed(true);
      },
    );
    return () => {
      current = false;
    };
  }, [picture, width]);
  return (
    <>
      <div ref={frame} style={{ minHeight: 336, minWidth: 0 }} />
      {failed && <p className={look.quiet}>The picture could not be loaded. The table below holds the same numbers.</p>}
    </>
  );
}
