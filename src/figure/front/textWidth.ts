/** Width of a text, px. */
export type TextWidth = (text: string, size: number, face: 'sans' | 'mono', weight: 400 | 500 | 600) => number;
