/** The two themes of the drawing; none chosen follows the system. */
export const themes = ['paper', 'blueprint'] as const;
export type Theme = (typeof themes)[number];

/** Cookie that keeps the choice, read on the server so that the first paint is right. */
export const themeCookie = 'floorwright-theme';

/** The theme of a cookie value; undefined for anything that is not one. */
export function readTheme(value: string | undefined): Theme | undefined {
  return themes.find((theme) => theme === value);
}
