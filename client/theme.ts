/**
 * The colour in which structures are drawn. Extensions cannot ask for a theme's colours, only for its kind, so these
 * are the text colours of the editor's own themes; on other themes of the same kind they read as well as text does.
 */
import { ColorThemeKind, window } from 'vscode';

const foregrounds: Record<ColorThemeKind, string> = {
  [ColorThemeKind.Light]: '#1f2328',
  [ColorThemeKind.Dark]: '#d4d4d4',
  [ColorThemeKind.HighContrast]: '#ffffff',
  [ColorThemeKind.HighContrastLight]: '#000000',
};

/** A CSS colour that stands out against the background of hovers and previews. */
export function themeForeground(): string {
  return foregrounds[window.activeColorTheme.kind];
}
