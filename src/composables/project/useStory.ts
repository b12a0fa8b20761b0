import { readStory } from '#shared/contracts/fitting.ts'
import { type RouteResponse } from '#shared/contracts/route.ts'
import { useQuery } from '@pinia/colada'
import { computed, type MaybeRefOrGetter, toValue } from 'vue'
import { call } from '@/api/call.ts'

export type StorySample = RouteResponse<typeof readStory>['samples'][number]

/** Every sample of a project in order, each with its photographs, observations and changes. */
export function useStory(projectId: MaybeRefOrGetter<string>) {
  const query = useQuery({
    key: () => ['project', toValue(projectId), 'story'],
    query: ({ signal }) => call(readStory, { params: { projectId: toValue(projectId) }, signal }),
  })
  const samples = computed<StorySample[]>(() => query.data.value?.samples ?? [])
  return { samples, loaded: computed(() => query.data.value !== undefined), error: query.error, refetch: query.refetch }
}
