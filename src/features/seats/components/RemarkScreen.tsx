import { limits } from '#shared/domain/limits.ts'
import { Button } from '#src/components/ui/Button.tsx'
import { TextArea } from '#src/components/ui/TextArea.tsx'
import type { Frame } from './RatingFamily.tsx'
import { ScreenTitle } from './ScreenTitle.tsx'
import { SeatFrame } from './SeatFrame.tsx'

interface RemarkScreenProps {
  frame: Frame
  remark: string
  onRemark: (remark: string) => void
  onNext: () => void
  onBack: () => void
}

/** Free text at the end of a serving; it may stay empty. */
export function RemarkScreen({ frame, remark, onRemark, onNext, onBack }: RemarkScreenProps) {
  return (
    <SeatFrame {...frame} verb={<Button onClick={onNext}>Next: a last look</Button>}>
      <ScreenTitle>A remark, in your own words</ScreenTitle>
      <div className="mt-4">
        <TextArea
          id="remark"
          label="Remark"
          hint="What the lines did not ask: a moment in a track, something odd. Do not write what you think it is; that is asked at the end."
          optional
          maxLength={limits.remark}
          defaultValue={remark}
          onChange={(event) => onRemark(event.target.value)}
        />
      </div>
      <div className="mt-4">
        <Button kind="secondary" icon="back" onClick={onBack}>
          Back to the lines
        </Button>
      </div>
    </SeatFrame>
  )
}
