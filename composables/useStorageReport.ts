import { onMounted, ref } from 'vue'

/** What the journal takes up on this device, and whether the browser promises to keep it. */
export function useStorageReport() {
  const usedBytes = ref<number | null>(null)
  const kept = ref<boolean | null>(null)

  async function read(): Promise<void> {
    const estimate = await navigator.storage?.estimate?.().catch(() => null)
    usedBytes.value = estimate?.usage ?? null
    kept.value = await navigator.storage?.persisted?.().catch(() => null) ?? null
  }

  /** Asks the browser to keep it. It decides by itself, often by how much the site is used. */
  async function ask(): Promise<void> {
    kept.value = await navigator.storage?.persist?.().catch(() => null) ?? null
  }

  onMounted(read)
  return { usedBytes, kept, ask }
}
