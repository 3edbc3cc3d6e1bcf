import { useId } from 'react'
import type { ComponentPropsWithRef, ReactNode } from 'react'
import { Icon } from '../Icon.tsx'
import type { IconName } from '../icon-paths.ts'
import { buttonLook } from './button-look.ts'
import type { ButtonKind } from './button-look.ts'

interface ButtonProps extends Omit<ComponentPropsWithRef<'button'>, 'disabled'> {
  kind?: ButtonKind
  children: ReactNode
  icon?: IconName
  /** True while the verb is in progress: the button stays in place, ignores presses, and a thread grows. */
  busy?: boolean
  /** The verb in progress: "Opening the round". */
  busyLabel?: string
  /** Why the button is off, shown beside it. The button stays in the tab order, so that the reason can be heard. */
  disabledReason?: string | null
}

/** A verb. Type is "button" unless said otherwise. */
export function Button({
  kind = 'primary',
  children,
  icon,
  busy = false,
  busyLabel,
  disabledReason,
  type = 'button',
  onClick,
  className = '',
  ...rest
}: ButtonProps) {
  const reasonId = useId()
  const off = Boolean(disabledReason)
  const button = (
    <button
      {...rest}
      type={type}
      className={`${buttonLook[kind]} ${className}`}
      aria-disabled={off || busy || undefined}
      aria-busy={busy || undefined}
      aria-describedby={off ? reasonId : rest['aria-describedby']}
      data-busy={busy || undefined}
      onClick={(event) => {
        if (off || busy) event.preventDefault()
        else onClick?.(event)
      }}
    >
      {icon && <Icon name={icon} />}
      <span>{busy ? (busyLabel ?? children) : children}</span>
      {busy && <span className="button-busy-thread" aria-hidden="true" />}
    </button>
  )
  if (!off) return button
  return (
    <span className="button-with-reason">
      {button}
      <span id={reasonId} className="note">
        {disabledReason}
      </span>
    </span>
  )
}

interface IconButtonProps extends ComponentPropsWithRef<'button'> {
  icon: 'plus' | 'minus' | 'close'
  /** The word that the sign stands for. */
  label: string
}

/** The only buttons without a word on them: − + and close. */
export function IconButton({ icon, label, className = '', ...rest }: IconButtonProps) {
  return (
    <button {...rest} type="button" aria-label={label} className={`icon-button ${className}`}>
      <Icon name={icon} />
    </button>
  )
}
