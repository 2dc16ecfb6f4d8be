/** Asks before a page with unsaved work is left, whether by a link or by closing the tab. */
export function useLeaveGuard(unsaved: () => boolean) {
  const onUnload = (event: BeforeUnloadEvent) => {
    if (unsaved()) event.preventDefault()
  }
  onMounted(() => window.addEventListener('beforeunload', onUnload))
  onBeforeUnmount(() => window.removeEventListener('beforeunload', onUnload))
  onBeforeRouteLeave(
    () => !unsaved() || window.confirm('The run has changes that are not saved. Leave and drop them?'),
  )
}
