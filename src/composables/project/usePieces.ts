import { listPieces } from '#shared/contracts/piece.ts'
import { useQuery } from '@pinia/colada'
import { computed, type MaybeRefOrGetter, toValue } from 'vue'
import { call } from '@/api/call.ts'

export const piecesKey = (projectId: string) => ['project', projectId, 'pieces'] as const

/** The tracing list of a project. */
export function usePieces(projectId: MaybeRefOrGetter<string>) {
  const query = useQuery({
    key: () => [...piecesKey(toValue(projectId))],
    query: ({ signal }) => call(listPieces, { params: { projectId: toValue(projectId) }, signal }),
  })
  return { pieces: computed(() => query.data.value?.pieces ?? []), tracing: query.data, error: query.error, refetch: query.refetch }
}
