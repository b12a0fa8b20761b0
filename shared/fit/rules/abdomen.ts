import { type Rule } from '../rule.ts'

export const abdomenRules: readonly Rule[] = []
