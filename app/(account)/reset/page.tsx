// Forgotten password.
import type { Metadata } from 'next'
import { Title } from '../_components/title'
import { ResetRequestForm } from './_components/reset-request-form'

export const metadata: Metadata = { title: 'Choose a new password' }

export default function ResetPage() {
  return (
    <>
      <Title lead="We mail you a link that lets you choose a new one.">Forgot your password?</Title>
      <ResetRequestForm />
    </>
  )
}
