import { type Rule } from '../rule.ts'

export const legRules: readonly Rule[] = []
