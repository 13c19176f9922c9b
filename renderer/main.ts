import { createPinia } from 'pinia';
import { createApp } from 'vue';
import App from './App.vue';
import { beginWith } from './begin.js';
import { openDesk } from './bridge.js';
import { applyTheme } from './theme/apply.js';
import './theme/base.css';

const ROOT = '#app';

/** Says in the place of the window why there is none. */
function sayWhy(error: unknown): void {
  applyTheme(document.documentElement, 'paper');
  const root = document.querySelector(ROOT);
  if (root !== null) root.textContent = error instanceof Error ? error.message : 'Wringwall could not start.';
}

/** The faces that the first screen is set in: laid out once they are here, it is laid out once. */
const FACES = [
  "400 12px 'Plex Sans'",
  "500 12px 'Plex Sans'",
  "600 12px 'Plex Sans'",
  "400 12px 'Plex Mono'",
  "500 12px 'Plex Mono'",
];

const faces = Promise.allSettled(FACES.map((face) => document.fonts.load(face)));
const app = createApp(App);
app.use(createPinia());
Promise.all([beginWith(openDesk()), faces])
  .then(() => {
    app.mount(ROOT);
  })
  .catch(sayWhy);
