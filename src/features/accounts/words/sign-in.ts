export const SIGN_IN_PAGE_WORDS = {
  title: 'Sign in',
  newHere: 'New here?',
  makeAccount: 'Make an account',
} as const;

export const SIGN_IN_FORM_WORDS = {
  lost: 'The server could not be reached. What you typed is still here: try again.',
  refused: 'You are not signed in yet',
  email: 'E-mail',
  password: 'Password',
  signIn: 'Sign in',
  signingIn: 'Signing in…',
  forgot: 'Forgot your password?',
} as const;
