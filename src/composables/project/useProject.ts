import { readProject } from '#shared/contracts/project.ts'
import { type Permission, may } from '#shared/contracts/permissions.ts'
import { useQuery } from '@pinia/colada'
import { computed, type MaybeRefOrGetter, toValue } from 'vue'
import { call } from '@/api/call.ts'

/** Key under which a project's head is kept, so that whoever changes it can have it read again. */
export const projectKey = (projectId: string) => ['project', projectId] as const

/** The head of a project (garment, wearer, pattern, samples) and what the person may do in it. */
export function useProject(projectId: MaybeRefOrGetter<string>) {
  const query = useQuery({
    key: () => [...projectKey(toValue(projectId))],
    query: ({ signal }) => call(readProject, { params: { projectId: toValue(projectId) }, signal }),
    enabled: () => toValue(projectId) !== '',
  })
  const project = computed(() => query.data.value ?? null)
  const can = (permission: Permission) => project.value !== null && may(project.value.role, permission)
  return { project, error: query.error, refetch: query.refetch, can }
}
