import { type Rule } from '../rule.ts'

export const armholeRules: readonly Rule[] = []
