declare module '*.css';

/** For tools that cannot look into a component; the type check itself can. */
declare module '*.vue' {
  import type { DefineComponent } from 'vue';

  const component: DefineComponent;
  export default component;
}
