'use client'
// Takes the deletion back.
import { ActionForm } from '@/components/ui/action-form'
import { keepAccountAction } from '../actions'

export function KeepForm() {
  return <ActionForm action={keepAccountAction} submit="Keep my account" />
}
