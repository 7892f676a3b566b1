// Sign-out for whoever comes by address: nothing happens before the button is pressed.
import type { Metadata } from 'next'
import { SignOutForm } from '../_components/sign-out-form'
import { Title } from '../_components/title'
import { signOutAction } from './actions'

export const metadata: Metadata = { title: 'Sign out' }

export default function SignOutPage() {
  return (
    <>
      <Title lead="On this device. Alerts that you asked for still come.">Sign out</Title>
      <SignOutForm action={signOutAction} submit="Sign out" look="main" />
    </>
  )
}
