import type { CSSProperties } from 'react';

/** Colours of the Paper theme; mail programs know no style sheets of ours. */
export const paper = {
  sheet: '#F5EFE2',
  recess: '#EAE2D0',
  lift: '#FCF9F2',
  ink: '#1D1A16',
  ink2: '#4A4338',
  rule: '#CDC2AB',
  stone: '#B3A587',
  spare: '#E6DDC8',
  act: '#1D4A6B',
} as const;

/** Fonts that every mail program has. */
export const fontFamily = 'Arial, Helvetica, sans-serif';

/** Fill and letter of a brick by lateness: early, day, late, night. */
export const bricks: Record<0 | 1 | 2 | 3, CSSProperties> = {
  0: { backgroundColor: paper.lift, color: paper.ink },
  1: { backgroundColor: paper.spare, color: paper.ink },
  2: { backgroundColor: paper.stone, color: paper.ink },
  3: { backgroundColor: paper.ink, color: paper.sheet },
};

export const paragraph: CSSProperties = { margin: '0 0 14px', fontSize: 15, lineHeight: 1.45 };
export const small: CSSProperties = { fontSize: 13, lineHeight: 1.4, color: paper.ink2 };
export const heading: CSSProperties = { margin: '22px 0 8px', fontSize: 17, lineHeight: 1.3 };
