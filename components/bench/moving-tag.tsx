'use client';

import { m } from 'framer-motion';
import type { TagView } from '@/lib/live/contract';
import { Tag, type TagSize } from '../tag/tag';

interface MovingTagProps {
  tag: Pick<TagView, 'id' | 'code'>;
  size?: TagSize;
  capHeight?: string;
}

/** The tag of a tool; when its place on the screen changes, it moves there. */
export function MovingTag({ tag, size = 'card', capHeight }: MovingTagProps) {
  return (
    <m.div
      layout="position"
      layoutId={tag.id}
      transition={{ duration: 0.4, ease: [0.2, 0, 0, 1] }}
      className="w-fit shrink-0"
    >
      <Tag code={tag.code} size={size} {...(capHeight === undefined ? {} : { capHeight })} />
    </m.div>
  );
}
