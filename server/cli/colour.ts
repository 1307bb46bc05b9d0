/** Colours on a terminal only, and not where the user has said no (no-color.org). */
export function wantsColour(): boolean {
  const { NO_COLOR: refused, FORCE_COLOR: forced } = process.env;
  if (refused !== undefined && refused !== '') return false;
  if (forced !== undefined && forced !== '' && forced !== '0') return true;
  return process.stdout.isTTY && process.env['TERM'] !== 'dumb';
}
