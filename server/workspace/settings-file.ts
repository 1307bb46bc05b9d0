/** The settings of a notebook, from the text of its `isonym.json`. */
import { settingsSchema } from '../checks/settings-schema.ts';
import { defaultSettings } from '../checks/settings.ts';
import { readSettingsText, type ReadSettings } from './settings-text.ts';

export { defaultSettings };

/** Every text gives settings: what is wrong in it is reported, and the default stands in its place. */
export function readSettings(text: string): ReadSettings {
  return readSettingsText(text, settingsSchema, defaultSettings);
}
