'use client';

import type { TagView } from '@/lib/live/contract';
import { Tag } from '../tag/tag';
import { MovingTag } from './moving-tag';

const placeWords = (tag: TagView): string | null =>
  tag.place === 'peg' ? `left with us, peg ${tag.peg}` : null;

interface ToolLineProps {
  tag: TagView;
  size?: 'card' | 'middle' | 'small';
  /** Stands in a list: the same tag may be elsewhere on the screen, and that one moves. */
  still?: boolean;
}

/** Tag and tool side by side, as everywhere on the bench. */
export function ToolLine({ tag, size = 'card', still = false }: ToolLineProps) {
  const look = size === 'middle' ? ({ size: 'card', capHeight: '1.7rem' } as const) : { size };
  const last = [tag.visitorName, placeWords(tag)].filter((words) => words !== null).join(' · ');
  return (
    <div className="flex items-center gap-4">
      {still ? <Tag code={tag.code} {...look} /> : <MovingTag tag={tag} {...look} />}
      <div className="min-w-0 leading-snug">
        <p className="font-bold">{tag.tool}</p>
        <p className="text-fore-quiet">{tag.plate}</p>
        <p className="text-fore-quiet">
          {tag.toolClass}
          {last && ` · ${last}`}
        </p>
      </div>
    </div>
  );
}
