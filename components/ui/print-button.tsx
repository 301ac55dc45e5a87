'use client'
// Opens the browser's print dialogue.
import { Button } from './button'

export function PrintButton() {
  return <Button look="primary" className="needs-script" onClick={() => window.print()}>Print</Button>
}
