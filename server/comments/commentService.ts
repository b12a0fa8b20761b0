import { type Queryable } from '#db/client.ts'
import { commentQueries } from '#db/queries/comments.ts'
import { userQueries } from '#db/queries/users.ts'
import { type createComment, type listComments } from '#shared/contracts/project.ts'
import { type RouteBody, type RouteResponse } from '#shared/contracts/route.ts'
import { personOf } from '../projects/projectState.ts'

type Comment = RouteResponse<typeof createComment>
type Row = Awaited<ReturnType<ReturnType<typeof commentQueries>['list']>>[number]

export const commentService = ({ db }: { db: Queryable }) => ({
  async list(projectId: string): Promise<RouteResponse<typeof listComments>> {
    return { comments: (await commentQueries(db).list(projectId)).map(toComment) }
  },
  async create(projectId: string, authorId: string, { text, sampleNumber }: RouteBody<typeof createComment>): Promise<Comment> {
    const [row, author] = [await commentQueries(db).insert({ projectId, authorId, text, sampleNumber }), await userQueries(db).find(authorId)]
    return toComment({ ...row, authorName: author?.name ?? null })
  },
})

const toComment = ({ id, authorId, authorName, text, sampleNumber, createdAt }: Row): Comment => ({
  id, text, sampleNumber, createdAt: createdAt.toISOString(), author: personOf(new Map(authorId && authorName ? [[authorId, authorName]] : []), authorId),
})
