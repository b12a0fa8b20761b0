import { type Rule } from '../rule.ts'

export const neckRules: readonly Rule[] = []
