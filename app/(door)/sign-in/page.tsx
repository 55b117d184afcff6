export default function SignInPage() {
  return <main>Sign in</main>;
}
