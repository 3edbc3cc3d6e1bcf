import type { Feature } from '../http/feature.ts'
import { rounds } from './rounds/routes.ts'

export const features: readonly Feature[] = [rounds]
