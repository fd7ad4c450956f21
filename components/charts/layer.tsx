import type { CSSProperties, PropsWithChildren } from 'react';

const style: CSSProperties = { position: 'absolute', top: 0, left: 0, display: 'block' };

/**
 * One drawing over the whole of a chart. Charts draw with the page's own SVG elements: a gain that moves draws some forty of them anew in
 * every frame, and each wrapper round one would cost more than the element itself.
 */
export function Layer({ width, height, children }: PropsWithChildren<{ width: number; height: number }>) {
  return (
    <svg width={width} height={height} style={style} aria-hidden>
      {children}
    </svg>
  );
}
