import type { SVGProps } from 'react';
import { ink } from './ink';

/** Keeps text readable where a line runs behind it. */
export const halo = {
  paintOrder: 'stroke',
  stroke: ink.sheet,
  strokeWidth: 5,
  strokeLinejoin: 'round',
} as const;

interface PictureTextProps extends Omit<SVGProps<SVGTextElement>, 'fontSize' | 'fontWeight'> {
  fontSize?: number;
  bold?: boolean;
}

/** Text in a picture. Its size is a style, since the page's reset outranks SVG's own attributes. */
export function PictureText({ fontSize = 13, bold = false, ...text }: PictureTextProps) {
  return <text {...text} style={{ fontSize: `${fontSize}px`, fontWeight: bold ? 600 : 400 }} />;
}
