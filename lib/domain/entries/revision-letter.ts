// Revisions are numbers in the data and letters for people: 1 = A … 26 = Z, 27 = AA.

/** The letter of revision `number` (1 or more). */
export function revisionLetter(number: number): string {
  let rest = number
  let letters = ''
  while (rest > 0) {
    const digit = (rest - 1) % 26
    letters = String.fromCharCode(65 + digit) + letters
    rest = (rest - 1 - digit) / 26
  }
  return letters
}

/** The number of a revision letter, or null when it is none ('a', '1', 'ABCDE'). */
export function revisionNumber(letter: string): number | null {
  if (!/^[A-Z]{1,4}$/.test(letter)) return null
  let number = 0
  for (const character of letter) number = number * 26 + (character.charCodeAt(0) - 64)
  return number
}
