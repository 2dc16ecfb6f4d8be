/** True below the width at which the sheet is set in two columns. False on the server, where no width is known. */
export function useNarrow() {
  const narrow = ref(false)
  let query: MediaQueryList | null = null
  const look = () => {
    narrow.value = query?.matches ?? false
  }
  onMounted(() => {
    query = window.matchMedia('(max-width: 63.99rem)')
    query.addEventListener('change', look)
    look()
  })
  onBeforeUnmount(() => query?.removeEventListener('change', look))
  return narrow
}
