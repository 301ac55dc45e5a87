// What has to be mended before a form can go, on top of the form, each line a link to its field. Nothing when there is nothing.

export interface ErrorSummaryProps {
  /** `id` is the field's id; without one the line is not a link. */
  errors: readonly { readonly id?: string, readonly message: string }[]
  title?: string
}

export function ErrorSummary({ errors, title }: ErrorSummaryProps) {
  if (errors.length === 0) return null
  return (
    <div className="error-summary" role="alert" tabIndex={-1} id="error-summary">
      <h2>{title ?? (errors.length === 1 ? 'One thing to mend' : `${errors.length} things to mend`)}</h2>
      <ul>
        {errors.map(({ id, message }) => (
          <li key={`${id ?? ''} ${message}`}>{id ? <a href={`#${id}`}>{message}</a> : message}</li>
        ))}
      </ul>
    </div>
  )
}
