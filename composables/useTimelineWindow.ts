import { computed, nextTick, onBeforeUnmount, ref, watch } from 'vue'
import type { Ref } from 'vue'
import { useRoute } from '#imports'

type Day = { day: number, entries: readonly { id: string }[] }

/** Entries put on the screen at first, and with every stretch scrolled to. */
const STRETCH = 16
/** The next stretch is laid out before the reader reaches its place. */
const AHEAD = '1200px'

/**
 * The part of a long timeline that is laid out: the newest stretch, more as the
 * reader comes near its end, and at once down to an entry that a link names,
 * which is then brought into sight.
 */
export function useTimelineWindow<T extends Day>(days: Readonly<Ref<readonly T[]>>) {
  const route = useRoute()
  const wanted = ref(STRETCH)
  const end = ref<HTMLElement | null>(null)
  const linked = computed(() => (route.hash.startsWith('#entry-') ? route.hash.slice('#entry-'.length) : null))

  const entriesDownTo = (id: string) => {
    let count = 0
    for (const { entries } of days.value) {
      count += entries.length
      if (entries.some(entry => entry.id === id)) return count
    }
    return 0
  }
  const shown = computed(() => {
    const least = Math.max(wanted.value, linked.value ? entriesDownTo(linked.value) : 0)
    let count = 0
    return days.value.filter(({ entries }) => {
      const fits = count < least
      count += entries.length
      return fits
    })
  })
  const more = computed(() => shown.value.length < days.value.length)
  const showMore = () => wanted.value = shown.value.reduce((sum, { entries }) => sum + entries.length, 0) + STRETCH

  let observer: IntersectionObserver | undefined
  watch(end, (element) => {
    observer?.disconnect()
    if (!element || typeof IntersectionObserver === 'undefined') return
    observer = new IntersectionObserver((seen) => {
      if (seen.some(one => one.isIntersecting)) showMore()
    }, { rootMargin: AHEAD })
    observer.observe(element)
  })
  onBeforeUnmount(() => observer?.disconnect())

  /** The entry a link names, once it is here. */
  const target = computed(() => (linked.value && entriesDownTo(linked.value) > 0 ? linked.value : null))
  watch(target, async (id) => {
    if (id === null) return
    await nextTick()
    const element = document.getElementById(`entry-${id}`)
    element?.scrollIntoView({ block: 'start' })
    element?.focus({ preventScroll: true })
  }, { immediate: true, flush: 'post' })

  return { shown, more, end, showMore }
}
