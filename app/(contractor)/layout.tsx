/** Contractors' people see the same frame; their role leaves in it what they may open. */
export { default } from '../(office)/layout'
