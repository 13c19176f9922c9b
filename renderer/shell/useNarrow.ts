import { onScopeDispose, ref, type Ref } from 'vue';

/** Below this the sheet is one column; a page zoomed to 200 % counts as half as wide. */
const NARROW = '(width < 1024px)';

/** Whether the window is too narrow for two columns; follows the window. */
export function useNarrow(): Ref<boolean> {
  const query = window.matchMedia(NARROW);
  const narrow = ref(query.matches);
  const follow = (): void => {
    narrow.value = query.matches;
  };
  query.addEventListener('change', follow);
  onScopeDispose(() => {
    query.removeEventListener('change', follow);
  });
  return narrow;
}
