import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, it } from 'vitest'
import { Corridor } from '@/components/charts/corridor'
import { CrateDrawing } from '@/components/crates/crate-drawing'
import { Field, InputBox } from '@/components/forms/field'
import { figureText, parseFigure } from '@/components/forms/figure'
import { fieldId } from '@/components/forms/field-id'
import { localText, parseLocalTime } from '@/components/forms/local-text'
import { LocalDateTimeInput } from '@/components/forms/local-date-time-input'
import { SubmitButton } from '@/components/forms/submit-button'
import { NumberInput, TextInput } from '@/components/forms/text-input'
import { Radios, Tick } from '@/components/forms/ticks'
import { Button } from '@/components/ui/button'
import { DocumentDrawing } from '@/components/ui/document-state'
import { WorkRow } from '@/components/ui/holes'
import { Stamp } from '@/components/ui/stamp'
import { VerdictCell } from '@/components/ui/verdict-cell'
import { input } from '@/tests/views/charts/journey-2417'

const html = renderToStaticMarkup
const words = (markup: string) =>
  markup
    .replace(/<[^>]+>/g, ' ')
    .replace(/\s+/g, ' ')
    .trim()

describe('stamp', () => {
  it('says its verdict in words, to eyes and to ears', () => {
    const conditional = html(<Stamp verdict="conditional" conditions={3} />)
    expect(conditional).toContain('aria-label="Verdict: go with conditions, 3 conditions"')
    expect(words(conditional)).toBe('GO WITH CONDITIONS 3')
    expect(html(<Stamp verdict="conditional" conditions={1} />)).toContain('1 condition"')
    expect(html(<Stamp verdict="no-go" />)).toContain('aria-label="Verdict: no-go"')
    expect(words(html(<Stamp verdict="go" size="l" />))).toBe('GO')
    expect(words(html(<Stamp verdict="none" />))).toBe('Not assessed')
  })

  it('shows an old verdict only as out of date', () => {
    expect(words(html(<Stamp verdict="go" outOfDate />))).toBe('OUT OF DATE')
  })

  it('fills with ink for NO-GO and for nothing else', () => {
    for (const verdict of ['go', 'conditional', 'none'] as const)
      expect(html(<Stamp verdict={verdict} />)).not.toContain('bg-ink')
    expect(html(<Stamp verdict="go" outOfDate />)).not.toContain('bg-ink')
    expect(html(<Stamp verdict="no-go" />)).toContain('bg-ink')
  })
})

describe('verdict cell', () => {
  it('names the verdict and the limit that decided', () => {
    const cell = words(
      html(
        <VerdictCell verdict="no-go" limit="critical, A">
          −16 min
        </VerdictCell>,
      ),
    )
    expect(cell).toBe('Verdict: no-go, −16 min critical, A')
  })

  it('strikes an old figure through', () => {
    expect(
      html(
        <VerdictCell verdict="go" outOfDate>
          46 min
        </VerdictCell>,
      ),
    ).toContain('<s')
  })
})

describe('fields', () => {
  it('tie label, hint and error to the control', () => {
    const markup = html(
      <TextInput id="plan-name" label="Name" hint="As on the paper" error="Name is missing." />,
    )
    expect(markup).toContain('for="plan-name"')
    expect(markup).toContain('aria-describedby="plan-name-hint plan-name-error"')
    expect(markup).toContain('aria-invalid="true"')
    expect(markup).toContain('id="plan-name-error"')
    expect(markup).toContain('id="plan-name-hint"')
  })

  it('have no placeholder and no aria-invalid while they are right', () => {
    const markup = html(<NumberInput id="a" label="Mass" unit="kg" />)
    expect(markup).not.toContain('placeholder')
    expect(markup).not.toContain('aria-invalid')
    expect(markup).toContain('inputMode="decimal"'.toLowerCase().replace('inputmode', 'inputMode'))
    expect(markup).toContain('kg')
  })

  it('draw an error as a double rule, never as a solid edge', () => {
    const markup = html(
      <Field id="x" label="x" error="Put 5.">
        <InputBox error>
          <input id="x" />
        </InputBox>
      </Field>,
    )
    expect(markup.match(/\bdbl\b/g)).toHaveLength(2)
    expect(markup).not.toContain('bg-ink')
  })

  it('group radios under their question and say why one isn’t open', () => {
    const markup = html(
      <Radios
        id="d"
        label="Decision"
        options={[
          { value: 'a', words: 'Approve', refused: 'three findings are overridden' },
          { value: 'r', words: 'Return' },
        ]}
      />,
    )
    expect(markup).toContain('<legend')
    expect(words(markup)).toBe('Decision Approve three findings are overridden Return')
    expect(markup.match(/disabled=""/g)).toHaveLength(1)
  })

  it('give a tick its words as its label', () => {
    expect(html(<Tick id="t" label="Crate trained" />)).toMatch(
      /<label[^>]*>.*type="checkbox".*Crate trained.*<\/label>/,
    )
  })
})

describe('what people type', () => {
  it.each([
    ['12,5', 12.5],
    ['12.5', 12.5],
    [' −3 ', -3],
    ['1 200', 1200],
    ['.5', 0.5],
    ['', null],
    [null, null],
    ['12x', '12x'],
    ['1.2.3', '1.2.3'],
    ['1e9', '1e9'],
  ])('%j is %j', (typed, meant) => expect(parseFigure(typed)).toBe(meant))

  it('shows a figure as it is typed', () => {
    expect(figureText(-3.25)).toBe('−3.25')
    expect(figureText('12x')).toBe('12x')
    expect(figureText(null)).toBe('')
  })

  it.each([
    ['2026-06-09 09:20', '2026-06-09T09:20'],
    ['2026-6-9 9.20', '2026-06-09T09:20'],
    ['2026/06/09, 09:20', '2026-06-09T09:20'],
    ['tomorrow', 'tomorrow'],
  ])('reads the time %j as %j', (typed, meant) => expect(parseLocalTime(typed)).toBe(meant))

  it('shows a time with a space', () => expect(localText('2026-06-09T09:20')).toBe('2026-06-09 09:20'))

  it('makes one id of form and path', () =>
    expect(fieldId('plan', 'legs.2.airTempC')).toBe('plan-legs-2-airTempC'))
})

describe('a local time', () => {
  const time = (value: string) =>
    html(
      <LocalDateTimeInput
        id="s"
        label="Start"
        zone="Europe/London"
        value={value}
        offsetMin={null}
        onChange={() => {}}
      />,
    )

  it('shows its zone and its day', () => {
    expect(words(time('2026-06-09T09:20'))).toContain('Tue 9 Jun, BST (UTC+1)')
    expect(time('2026-06-09T09:20')).toContain('value="2026-06-09 09:20"')
  })

  // Clocks go back at 02:00 BST on 25 October 2026 and forward at 01:00 GMT on 29 March 2026 (the Summer Time Act's last
  // Sundays), so 01:30 comes twice and 01:30 in March never.
  it('asks which one where the clock shows the hour twice', () => {
    const twice = words(time('2026-10-25T01:30'))
    expect(twice).toContain('first, BST (UTC+1)')
    expect(twice).toContain('second, GMT (UTC)')
  })

  it('says what comes next where the clock skips it', () => {
    expect(words(time('2026-03-29T01:30'))).toContain('skips this time; the next one is 2026-03-29 02:00')
  })
})

describe('buttons', () => {
  it('that can’t be pressed stay in reach and say why', () => {
    const markup = html(<Button refused="Say why first">Sign crate 2417-A</Button>)
    expect(markup).toContain('aria-disabled="true"')
    expect(markup).toContain('title="Say why first"')
    expect(markup).not.toContain('disabled=""')
    expect(
      words(
        html(
          <SubmitButton pending={false} refused="Put right the e-mail address.">
            Send
          </SubmitButton>,
        ),
      ),
    ).toBe('Send Put right the e-mail address.')
  })

  it('say in words that they are sending, and can’t send twice', () => {
    const markup = html(<SubmitButton pending>Send</SubmitButton>)
    expect(words(markup)).toBe('Sending')
    expect(markup).toContain('type="button"')
    expect(markup).toContain('aria-busy="true"')
  })
})

describe('drawings', () => {
  it('of a document’s state are for eyes only and hold no solid ink', () => {
    for (const state of ['current', 'superseded', 'void', 'unknown', 'not-as-issued'] as const) {
      const markup = html(<DocumentDrawing state={state} />)
      expect(markup).toContain('aria-hidden="true"')
      expect(markup).not.toContain('fill-ink')
    }
  })

  it('of long work say how far in words', () => {
    const markup = html(<WorkRow done={3} of={7} words="Leg 4 of 7, Bramble." more="84 of 200 runs." />)
    expect(markup).toContain('role="status"')
    expect(markup.match(/fill-ink/g)).toHaveLength(3)
    expect(words(markup)).toBe('Leg 4 of 7, Bramble. 84 of 200 runs.')
  })

  it('of a corridor carry a sentence, and their reading line is a slider with words', () => {
    const markup = html(<Corridor input={input} />)
    expect(markup).toContain('role="img" aria-label="Corridor of Bramble over 9 legs')
    expect(markup).toMatch(/role="slider"[^>]*aria-valuetext="03:15\u00a0GST, leg 8, body 40\.5/)
    expect(markup).toContain('Show as table')
    expect(markup).toContain('aria-label="Leg 7, Ramp"')
  })

  it('of a crate say its open share', () => {
    const shape = {
      mark: '2417-A',
      lengthCm: 60,
      widthCm: 40,
      heightCm: 40,
      openings: [],
      waterContainerL: null,
      animalCm: null,
    }
    expect(html(<CrateDrawing shape={shape} />)).toContain('0.0\u00a0% of the four sides')
  })
})
