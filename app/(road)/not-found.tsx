export { default } from '@/app/nothing-here'
