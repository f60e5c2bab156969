import { useId, type CSSProperties } from 'react';
import { outlineOf, wordsOf, type Drawing, type Outline, type Primitive } from '@bellgap/common/drawing';
import { LAYER_STYLES } from './layer-styles';

export interface DrawingViewProps {
  drawing: Drawing;
  className?: string;
  /** The figure that the pointer is on, here or in the ledger; what belongs to it is drawn stronger. */
  hoveredAbout?: string | null;
  /** Told which figure the pointer is on, or null when it leaves. */
  onAbout?: (about: string | null) => void;
}

const GROUND = 'var(--bg-surface)';
const HIT_WIDTH_PX = 12;
const TINT = 'var(--bg-rule)';

/** A drawing as SVG: it fills the width it is given and keeps its proportions. */
export function DrawingView({ drawing, className, hoveredAbout = null, onAbout }: DrawingViewProps) {
  const id = useId();
  return (
    <svg
      className={className}
      viewBox={`0 0 ${drawing.widthMm.toFixed(1)} ${drawing.heightMm.toFixed(1)}`}
      preserveAspectRatio="xMidYMin meet"
      width="100%"
      height="100%"
      role="img"
      aria-labelledby={`${id}title ${id}desc`}
      style={{ display: 'block', fontFamily: 'var(--font-mono, "IBM Plex Mono", monospace)' }}
      fontSize={drawing.textHeightMm}
      strokeLinecap="round"
      strokeLinejoin="round"
    >
      <title id={`${id}title`}>{drawing.title}</title>
      <desc id={`${id}desc`}>{drawing.description}</desc>
      {drawing.primitives.map((primitive, index) => (
        <Mark
          key={index}
          primitive={primitive}
          textHeightMm={drawing.textHeightMm}
          strong={hoveredAbout !== null && primitive.about === hoveredAbout}
          {...(onAbout ? { onAbout } : {})}
        />
      ))}
    </svg>
  );
}

function fillOf(fill: Outline['fill'], ink: string): string {
  if (fill === 'none') return 'none';
  if (fill === 'ink') return ink;
  return fill === 'tint' ? TINT : GROUND;
}

interface MarkProps {
  primitive: Primitive;
  textHeightMm: number;
  strong: boolean;
  onAbout?: (about: string | null) => void;
}

function Mark({ primitive, textHeightMm, strong, onAbout }: MarkProps) {
  const style = LAYER_STYLES[primitive.layer];
  const outline = outlineOf(primitive, textHeightMm);
  const words = wordsOf(primitive, textHeightMm);
  const { about } = primitive;
  const linked = onAbout && about !== undefined;
  const stroke = strong ? 'var(--bg-ink)' : style.stroke;
  const dash = outline?.dashed ? { strokeDasharray: '5 4' } : {};
  const halo: CSSProperties = { paintOrder: 'stroke', stroke: GROUND, strokeWidth: 0.28 * textHeightMm };
  return (
    <g
      data-layer={primitive.layer}
      {...(about === undefined ? {} : { 'data-about': about })}
      {...(linked ? { onPointerEnter: () => onAbout(about), onPointerLeave: () => onAbout(null) } : {})}
    >
      {outline && linked && outline.fill === 'none' && (
        <path
          d={outline.data}
          fill="none"
          stroke="transparent"
          strokeWidth={HIT_WIDTH_PX}
          vectorEffect="non-scaling-stroke"
        />
      )}
      {outline && (
        <path
          d={outline.data}
          fill={fillOf(outline.fill, stroke)}
          stroke={stroke}
          strokeWidth={style.widthPx + (strong ? 0.8 : 0)}
          vectorEffect="non-scaling-stroke"
          {...dash}
        />
      )}
      {words && (
        <text
          x={words.at.xMm.toFixed(1)}
          y={words.at.yMm.toFixed(1)}
          textAnchor={words.anchor}
          fill={strong ? 'var(--bg-ink)' : style.words}
          style={halo}
          {...(strong ? { fontWeight: 600 } : {})}
          {...(words.angleDeg === 0
            ? {}
            : {
                transform: `rotate(${words.angleDeg.toFixed(2)} ${words.at.xMm.toFixed(1)} ${words.at.yMm.toFixed(1)})`,
              })}
        >
          {words.text}
        </text>
      )}
    </g>
  );
}
