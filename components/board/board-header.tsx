import clsx from 'clsx';
import { WarningShape } from '@/components/ui/warning-shape';
import css from './board.module.css';

interface BoardHeaderProps {
  meetName: string;
  /** '14:32' in the meet's zone. */
  time: string;
  /** Why the board may be old; null while the post is heard. */
  lost: string | null;
}

/** Whose board it is and what time it is; or, first of all, that it may be old. */
export function BoardHeader({ meetName, time, lost }: BoardHeaderProps) {
  return (
    <>
      <div role="alert">
        {lost !== null && (
          <p className={clsx('ground-chalk', css.lost, css.state)}>
            <WarningShape className="size-16 shrink-0" />
            {lost}
          </p>
        )}
      </div>
      <header className={clsx(css.header, lost !== null && 'sr-only')}>
        <h1 className={clsx('font-code font-semibold', css.title)}>Torque tool check</h1>
        <p className={clsx('text-fore-quiet', css.meet)}>{meetName}</p>
        <p className={clsx('font-code font-semibold tabular-nums', css.clock)}>
          <span className="sr-only">The time is </span>
          {time}
        </p>
      </header>
    </>
  );
}
