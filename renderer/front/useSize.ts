import { onBeforeUnmount, onMounted, ref, type Ref } from 'vue';

/** The size of an element, px, as it changes. */
export function useSize(element: Readonly<Ref<HTMLElement | null>>, first: { width: number; height: number }) {
  const size = ref(first);
  let observer: ResizeObserver | null = null;
  onMounted(() => {
    if (element.value === null) return;
    observer = new ResizeObserver(([entry]) => {
      const { width = 0, height = 0 } = entry?.contentRect ?? {};
      const [across, down] = [Math.floor(width), Math.floor(height)];
      if (across > 0 && down > 0 && (across !== size.value.width || down !== size.value.height))
        size.value = { width: across, height: down };
    });
    observer.observe(element.value);
  });
  onBeforeUnmount(() => {
    observer?.disconnect();
  });
  return size;
}
