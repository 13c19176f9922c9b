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

const app = createApp(App);
app.use(createPinia());
beginWith(openDesk())
  .then(() => {
    app.mount(ROOT);
  })
  .catch(sayWhy);
