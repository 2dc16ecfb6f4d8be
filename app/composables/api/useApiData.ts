import { problemOf, useApi } from '~/composables/api/useApi'

/**
 * Loads a record for a page, on the server at first. A refusal becomes the error page of its status, so that an
 * outsider sees "not found" and nothing else.
 */
export async function useApiData<Answer>(key: string, path: () => string) {
  const api = useApi()
  // Per page: while one page gives way to the next, a shared key would hand over what the first had loaded.
  const pageKey = `${key} on ${useRoute().path}`
  const { data, refresh } = await useAsyncData(
    pageKey,
    async () => {
      try {
        return await api.get<Answer>(path())
      } catch (error) {
        const { status, title, detail } = problemOf(error)
        throw createError({ statusCode: status || 503, statusMessage: title, message: detail, fatal: true })
      }
    },
    { deep: false },
  )
  if (!data.value) throw createError({ statusCode: 404, statusMessage: 'Not found', fatal: true })
  return { data: data as Ref<Answer>, refresh }
}
