import { render, screen } from '@testing-library/react'
import { describe, expect, it } from 'vitest'
import { DescriptorSpread } from './DescriptorSpread.tsx'
import { machines, unsaid } from './result.fixture.ts'

describe('one descriptor a spread', () => {
  it('says agreement in words and in numbers, and how much weight the sentence carries', () => {
    render(<DescriptorSpread result={machines} />)
    expect(
      screen.getByText(/One listener against another: 0\.58, between 0\.10 and 0\.95/),
    ).toBeInTheDocument()
    expect(screen.getByText(/Krippendorff’s alpha 0\.61, between 0\.30 and 0\.80/)).toBeInTheDocument()
    expect(screen.getByText(/Kendall’s W 0\.86, p 0\.00[56]/)).toBeInTheDocument()
    expect(screen.getByText(/The primary descriptor/)).toBeInTheDocument()
    expect(screen.getByText(machines.sentence)).toBeInTheDocument()
  })

  it('calls listeners by name where names are given, else by number', () => {
    const { unmount } = render(<DescriptorSpread result={machines} listenerName={(nr) => `Name ${nr}`} />)
    expect(screen.getByText('Name 10', { selector: 'th' })).toBeInTheDocument()
    unmount()
    render(<DescriptorSpread result={machines} />)
    expect(screen.getByText('Listener 10', { selector: 'th' })).toBeInTheDocument()
  })

  it('says why where nothing can be said, instead of a number', () => {
    render(<DescriptorSpread result={unsaid} />)
    expect(screen.getAllByText(/Only one listener rated it/).length).toBeGreaterThan(0)
    expect(document.body.textContent).not.toMatch(/NaN|null|undefined/)
  })
})
