import type { Step } from '@wedgeline/engine'
import { Text } from '@/components/ui/text'
import { unitText } from '../checks/words'
import { Formula, printedFigure } from './formula'
import { figureText, formulaParts, putIn, symbolPart } from './formula-text'

/** A step as one sum: symbol, formula, numbers put in, result with its unit. */
export function StepSum({ step, isPrinted = false }: { readonly step: Step; readonly isPrinted?: boolean }) {
  const numbers = putIn(step.formula, step.values)
  const result = figureText(step.value)
  const figure = isPrinted ? printedFigure : null
  return (
    <>
      <Formula
        isPrinted={isPrinted}
        parts={[symbolPart(step.symbol), { text: ' = ' }, ...formulaParts(step.formula)]}
      />
      {numbers === result || isBare(step) ? null : <Text kind="figure" style={figure}>{` = ${numbers}`}</Text>}
      <Text
        kind="figureStrong"
        style={figure}
      >{` = ${result}${step.unit === '-' ? '' : ` ${unitText(step.unit)}`}`}</Text>
    </>
  )
}

/** The formula is a number or one name alone: putting it in would say the result twice. */
const isBare = ({ formula }: Step): boolean => /^[\w.]+$/.test(formula)
