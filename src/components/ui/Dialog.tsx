import * as Radix from '@radix-ui/react-dialog'
import { useRef } from 'react'
import type { ReactNode } from 'react'
import { Button, IconButton } from './Button.tsx'

interface DialogProps {
  open: boolean
  onOpenChange: (open: boolean) => void
  title: ReactNode
  description?: ReactNode
  children?: ReactNode
  /** Verbs, the one that acts first. */
  actions?: ReactNode
}

/** A question on top of the page: from the bottom edge on a phone, high on the page elsewhere. Escape closes it. */
export function Dialog({ open, onOpenChange, title, description, children, actions }: DialogProps) {
  const cameFrom = useRef<Element | null>(null)
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <Radix.Overlay className="dialog-veil" />
        <Radix.Content
          className="dialog"
          // The question itself takes focus, so that it is heard before its verbs.
          onOpenAutoFocus={(event) => {
            event.preventDefault()
            cameFrom.current = document.activeElement
            if (event.currentTarget instanceof HTMLElement) event.currentTarget.focus()
          }}
          onCloseAutoFocus={(event) => {
            event.preventDefault()
            if (cameFrom.current instanceof HTMLElement) cameFrom.current.focus()
          }}
          {...(description ? {} : { 'aria-describedby': undefined })}
        >
          <div className="flex items-start justify-between gap-4">
            <Radix.Title className="heading">{title}</Radix.Title>
            <Radix.Close asChild>
              <IconButton icon="close" label="Close" className="-mt-2 -mr-3" />
            </Radix.Close>
          </div>
          {description && (
            <Radix.Description asChild>
              <div className="mt-2 max-w-measure">{description}</div>
            </Radix.Description>
          )}
          {children && <div className="mt-4">{children}</div>}
          {actions && <div className="actions mt-6">{actions}</div>}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  )
}

interface ConfirmDialogProps extends Omit<DialogProps, 'actions' | 'description'> {
  /** What will be so afterwards, and whether it can be undone. */
  consequence: ReactNode
  /** The verb again, in full: "Close the round". */
  confirmLabel: string
  busyLabel?: string
  cancelLabel?: string
  destructive?: boolean
  busy?: boolean
  disabledReason?: string | null
  onConfirm: () => void
}

/** Asks before what cannot be undone. Stays open while busy; the caller closes it when the act is done. */
export function ConfirmDialog({
  consequence,
  confirmLabel,
  busyLabel,
  cancelLabel = 'Not now',
  destructive = false,
  busy = false,
  disabledReason,
  onConfirm,
  ...dialog
}: ConfirmDialogProps) {
  return (
    <Dialog
      {...dialog}
      onOpenChange={(open) => {
        if (!busy) dialog.onOpenChange(open)
      }}
      description={consequence}
      actions={
        <>
          <Button
            kind={destructive ? 'destructive-confirm' : 'primary'}
            busy={busy}
            busyLabel={busyLabel}
            disabledReason={disabledReason}
            onClick={onConfirm}
          >
            {confirmLabel}
          </Button>
          <Button kind="secondary" onClick={() => dialog.onOpenChange(false)} disabledReason={null}>
            {cancelLabel}
          </Button>
        </>
      }
    />
  )
}
