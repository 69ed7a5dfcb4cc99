import { onBeforeUnmount, onMounted, ref } from 'vue'
import { STORY_DAY_SHOWN } from '~/utils/landing/bucket-story'

const PLAY_MILLISECONDS = 6_000
/** The drawing is made anew about this often while it plays. */
const FRAME_MILLISECONDS = 50

/** Plays the bucket's first days once, unless the reader wants no motion; after that the slider is theirs. */
export function useBucketStory() {
  const day = ref(STORY_DAY_SHOWN)
  const awake = ref(false)
  let timer: ReturnType<typeof setInterval> | undefined

  function stop(): void {
    clearInterval(timer)
  }

  function play(): void {
    const start = performance.now()
    day.value = 0
    timer = setInterval(() => {
      const share = Math.min(1, (performance.now() - start) / PLAY_MILLISECONDS)
      day.value = Math.round(share * STORY_DAY_SHOWN * 4) / 4
      if (share === 1) stop()
    }, FRAME_MILLISECONDS)
  }

  onMounted(() => {
    awake.value = true
    if (!window.matchMedia('(prefers-reduced-motion: reduce)').matches) play()
  })
  onBeforeUnmount(stop)

  function set(chosen: number): void {
    stop()
    day.value = chosen
  }

  return { day, awake, set }
}
