import type { DescriptorResult } from '#shared/contracts/analysis.ts'
import { DataTable } from '../ui/DataTable.tsx'
import { fromTheTop } from './by-family.ts'
import { asComponent, asDf, asP, asPoints, asRange } from './figures.ts'
import { PairTable } from './PairTable.tsx'

type Model = Extract<DescriptorResult['model'], { formula: string }>

/** What a component estimated at zero means. It stays in the model. */
const boundaryWords: Record<string, string> = {
  panelist: 'no sign that some listeners rate everything higher or lower',
  'panelist:unit': 'no sign that listeners order the units differently',
  residual: 'no spread left over',
}

function componentsOf({ components }: Model): { name: string; variance: number }[] {
  return [
    { name: 'panelist', variance: components.panelist },
    ...(components.panelistUnit === null
      ? []
      : [{ name: 'panelist:unit', variance: components.panelistUnit }]),
    { name: 'residual', variance: components.residual },
  ]
}

function MeansTable({ result, method }: { result: DescriptorResult; method: string }) {
  const { scale, name } = result.descriptor
  return (
    <DataTable
      caption={`${name}: means of each unit; adjusted by ${method}, with 95 % interval`}
      density="close"
      rows={fromTheTop(result.units)}
      rowKey={(unit) => unit.unit}
      columns={[
        { key: 'unit', header: 'Unit', cell: (unit) => unit.unit },
        { key: 'n', header: 'n', numeric: true, cell: (unit) => unit.n },
        { key: 'mean', header: 'Mean', numeric: true, cell: (unit) => asPoints(unit.mean, scale) },
        { key: 'sd', header: 'SD', numeric: true, cell: (unit) => asPoints(unit.sd, scale) },
        {
          key: 'adjusted',
          header: 'Adjusted mean',
          numeric: true,
          cell: (unit) => asPoints(unit.adjusted?.mean ?? null, scale),
        },
        {
          key: 'interval',
          header: '95 % interval',
          numeric: true,
          cell: (unit) => (unit.adjusted ? asRange(unit.adjusted.low, unit.adjusted.high, scale) : '–'),
        },
        {
          key: 'se',
          header: 'Standard error',
          numeric: true,
          cell: (unit) => (unit.adjusted ? asComponent(unit.adjusted.standardError) : '–'),
        },
        {
          key: 'df',
          header: 'df',
          numeric: true,
          cell: (unit) => (unit.adjusted ? asDf(unit.adjusted.df) : '–'),
        },
      ]}
    />
  )
}

/** The model behind a descriptor's figures: formula, variance components, criterion, test of units, means and pairs. */
export function ModelNumbers({ result }: { result: DescriptorResult }) {
  const { model } = result
  if (!('formula' in model))
    return (
      <div className="mt-2 space-y-6">
        <p>{model.sentence}</p>
        <MeansTable result={result} method="no model" />
      </div>
    )
  const zero = model.boundary.map(
    (name) => `${name} is estimated at zero: ${boundaryWords[name] ?? 'it stays in the model'}.`,
  )
  return (
    <div className="mt-2 space-y-6">
      <p className="measure">
        <code>{model.formula}</code>, fitted by {model.method}. Restricted likelihood criterion{' '}
        {asComponent(model.remlCriterion)}.
        {model.unitTest &&
          ` Test of units: F(${asDf(model.unitTest.df1)}, ${asDf(model.unitTest.df2)}) = ${asComponent(model.unitTest.f)}, p ${asP(model.unitTest.p)}.`}
      </p>
      <DataTable
        caption={`${result.descriptor.name}: variance components`}
        density="close"
        stays
        rows={componentsOf(model)}
        rowKey={(row) => row.name}
        columns={[
          { key: 'name', header: 'Component', cell: (row) => row.name },
          { key: 'variance', header: 'Variance', numeric: true, cell: (row) => asComponent(row.variance) },
          {
            key: 'sd',
            header: 'Standard deviation',
            numeric: true,
            cell: (row) => asComponent(Math.sqrt(Math.max(0, row.variance))),
          },
        ]}
      />
      {zero.map((sentence) => (
        <p key={sentence} className="note measure">
          {sentence}
        </p>
      ))}
      <MeansTable result={result} method={model.method} />
      <PairTable result={result} />
    </div>
  )
}
