/** What the user prefers of the screen, kept on this device: the theme and the system of units. Plans know nothing of either. */
import { createContext } from 'svelte';
import type { System } from '$lib/words/units/unit';

/** `system`: as the device has it. */
export const THEMES = ['system', 'light', 'dark'] as const;
export type Theme = (typeof THEMES)[number];

export const SYSTEMS: readonly System[] = ['metric', 'imperial'];

/** Also read by static/theme.js, before the page is painted. */
export const THEME_KEY = 'sealwright-theme';
export const SYSTEM_KEY = 'sealwright-units';

export class Preferences {
  #theme = $state<Theme>('system');
  #system = $state<System>('metric');
  #store: Storage | null = null;
  #root: HTMLElement | null = null;

  /** Takes over what is stored, and from here on stores what is chosen and shows the theme on the root element. */
  restore(store: Storage | null, root: HTMLElement): void {
    this.#store = store;
    this.#root = root;
    this.#theme = THEMES.find((theme) => theme === this.#stored(THEME_KEY)) ?? 'system';
    this.#system = SYSTEMS.find((system) => system === this.#stored(SYSTEM_KEY)) ?? 'metric';
    this.#show();
  }

  get theme(): Theme {
    return this.#theme;
  }
  set theme(theme: Theme) {
    this.#theme = theme;
    this.#show();
    this.#keep(THEME_KEY, theme);
  }

  /** The system of units shown. */
  get system(): System {
    return this.#system;
  }
  set system(system: System) {
    this.#system = system;
    this.#keep(SYSTEM_KEY, system);
  }

  #show(): void {
    if (this.#root === null) return;
    if (this.#theme === 'system') delete this.#root.dataset.theme;
    else this.#root.dataset.theme = this.#theme;
  }

  #stored(key: string): string | null {
    try {
      return this.#store?.getItem(key) ?? null;
    } catch {
      return null;
    }
  }

  #keep(key: string, value: string): void {
    try {
      this.#store?.setItem(key, value);
    } catch {
      // Full or forbidden: the choice lasts as long as the page.
    }
  }
}

export const [getPreferences, setPreferences] = createContext<Preferences>();
