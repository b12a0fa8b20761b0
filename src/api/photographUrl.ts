import { type PhotographSize } from '#shared/contracts/photograph.ts'

/** Address of a photograph in one of its three sizes. Written out, so that a page which only shows one needs no contract. */
export const photographUrl = (projectId: string, photographId: string, size: PhotographSize): string => `/api/projects/${projectId}/photographs/${photographId}/${size}`
