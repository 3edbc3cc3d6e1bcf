export type ButtonKind = 'primary' | 'secondary' | 'destructive' | 'destructive-confirm'

/**
 * primary: ink ground, one to a screen. secondary: text over a thread. destructive: signal text over a thread;
 * destructive-confirm: the filled one that does what cannot be undone.
 */
export const buttonLook: Record<ButtonKind, string> = {
  primary: 'button button-primary',
  secondary: 'button button-secondary',
  destructive: 'button button-danger',
  'destructive-confirm': 'button button-primary button-danger-filled',
}
