import { memo } from 'react';
import { streakLayers } from './streak-svg.ts';
import type { StreakInput } from './streak-types.ts';

type StoneProps = Omit<StreakInput, 'theme'>;

const Layer = memo(function Layer({ svg }: { svg: string }) {
  return <g dangerouslySetInnerHTML={{ __html: svg }} />;
});

/** The drawn stone. Its strings come from our own pure drawing, never from a member's text. */
export function StreakStone({ title, description, ...drawing }: StoneProps) {
  const { stone, marks, width, height } = streakLayers({ ...drawing, theme: 'screen' });
  const isList = drawing.size === 'cell';
  const names = title
    ? { role: 'img', 'aria-labelledby': `${drawing.id}-t`, 'aria-describedby': `${drawing.id}-d` }
    : { 'aria-hidden': true };
  const isFluid = drawing.width !== undefined || isList || drawing.size === 'card';
  return (
    <svg
      className={isList ? 'streak-cell-svg' : isFluid ? 'streak-svg' : 'streak-svg streak-fixed'}
      viewBox={`0 0 ${width} ${height}`}
      width={width}
      height={height}
      preserveAspectRatio={isList ? 'none' : undefined}
      {...names}
    >
      {title && <title id={`${drawing.id}-t`}>{title}</title>}
      {title && <desc id={`${drawing.id}-d`}>{description}</desc>}
      <Layer svg={stone} />
      <Layer svg={marks} />
    </svg>
  );
}
