export { toSi, type Si } from './si'
