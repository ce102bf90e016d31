export { NothingHere as default } from '@/components/people/nothing-here'
