'use client'
export { default } from '../(office)/error'
