import { type Rule } from '../rule.ts'

export const upperBackRules: readonly Rule[] = []
