import type { ReactNode } from 'react'
import { Link } from 'react-router-dom'
import type { LinkProps } from 'react-router-dom'
import { Icon } from '../Icon.tsx'
import type { IconName } from '../icon-paths.ts'
import { buttonLook } from './button-look.ts'

interface LinkButtonProps extends Omit<LinkProps, 'className'> {
  kind?: 'primary' | 'secondary'
  icon?: IconName
  /** For files that the server gives (CSV, JSON): a plain link instead of a route. */
  download?: boolean | string
  children: ReactNode
}

/** A place to go that looks like a verb. */
export function LinkButton({ kind = 'secondary', icon, children, download, to, ...rest }: LinkButtonProps) {
  const inner = (
    <>
      {icon && <Icon name={icon} />}
      <span>{children}</span>
    </>
  )
  if (download !== undefined) {
    return (
      <a {...rest} href={String(to)} download={download} className={buttonLook[kind]}>
        {inner}
      </a>
    )
  }
  return (
    <Link {...rest} to={to} className={buttonLook[kind]}>
      {inner}
    </Link>
  )
}
