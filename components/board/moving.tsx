'use client';

import { LayoutGroup, LazyMotion, MotionConfig } from 'framer-motion';
import * as m from 'framer-motion/m';
import { createContext, useContext, type ReactNode } from 'react';

const loadFeatures = () => import('./motion-features').then((module) => module.default);

/** Long enough to follow by eye, over before anybody reads. */
const MOVE = { duration: 0.45, ease: [0.3, 0, 0.1, 1] } as const;

const Places = createContext('');

/** Where tags move: `places` changes exactly when some tag hangs somewhere else. */
export function MovingWall({ places, children }: { places: string; children: ReactNode }) {
  return (
    <MotionConfig reducedMotion="user" transition={MOVE}>
      <LazyMotion features={loadFeatures} strict>
        <LayoutGroup>
          <Places.Provider value={places}>{children}</Places.Provider>
        </LayoutGroup>
      </LazyMotion>
    </MotionConfig>
  );
}

/**
 * What stands for one tag. When the same code stands elsewhere afterwards it travels there; it is
 * measured only when a place changes, never for a reading or the clock.
 */
export function Moving({
  code,
  as = 'div',
  className,
  children,
}: {
  code: string;
  as?: 'div' | 'li';
  className?: string | undefined;
  children: ReactNode;
}) {
  const places = useContext(Places);
  const Element = as === 'li' ? m.li : m.div;
  return (
    <Element layout="position" layoutId={code} layoutDependency={places} className={className}>
      {children}
    </Element>
  );
}
