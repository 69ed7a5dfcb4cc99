import type { Ref } from 'vue'

/** The size of an element as it changes; `start` stands in until it is known. */
export function useBoxSize(element: Readonly<Ref<HTMLElement | null>>, start: { width: number, height: number }) {
  const width = ref(start.width)
  const height = ref(start.height)
  let observer: ResizeObserver | undefined

  function measure(): void {
    const box = element.value?.getBoundingClientRect()
    // Something that is not laid out has no size worth drawing for.
    if (!box || box.width === 0 || box.height === 0) return
    width.value = box.width
    height.value = box.height
  }

  onMounted(() => {
    measure()
    if (!element.value || typeof ResizeObserver === 'undefined') return
    observer = new ResizeObserver(measure)
    observer.observe(element.value)
  })
  onBeforeUnmount(() => observer?.disconnect())
  return { width, height }
}
