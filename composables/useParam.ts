import { computed } from 'vue'
import { useRoute } from '#imports'

/** One part of the page's address, such as the id of a plant; empty when the address has none. */
export function useParam(name: string) {
  const route = useRoute()
  return computed(() => {
    const value = Object.entries(route.params).find(([key]) => key === name)?.[1]
    return typeof value === 'string' ? value : ''
  })
}
