// Our own prose from content/pages and content/shop-notes, compiled from MDX. MDX is code: what members write never comes here.
import 'server-only'
import { readdir, readFile, stat } from 'node:fs/promises'
import path from 'node:path'
import { evaluate } from '@mdx-js/mdx'
import type { MDXComponents, MDXContent } from 'mdx/types'
import { createElement, type ComponentType } from 'react'
import * as runtime from 'react/jsx-runtime'
import remarkGfm from 'remark-gfm'
import { parse } from 'yaml'
import { z } from 'zod'

const frontmatter = z.strictObject({ title: z.string().min(1).max(80), summary: z.string().min(1).max(160) })

export interface PageSummary { slug: string; title: string; summary: string }
export interface Page { title: string; summary: string; Content: ComponentType }

interface CompiledPage { changedAt: number; title: string; summary: string; body: MDXContent }

/** Folders of content/ that hold pages: the guide, and what stands under each shop table. */
export type PageFolder = 'pages' | 'shop-notes'

const directory = (folder: PageFolder): string => path.join(process.cwd(), 'content', folder)
const compiled = new Map<string, Promise<CompiledPage>>()

/**
 * The page named `slug` with `components` in place of HTML elements, or null when there is none. A file is
 * compiled once and again only when it changed. Throws when a page of the repository has bad frontmatter.
 */
export async function loadPage(slug: string, components: MDXComponents, folder: PageFolder = 'pages'): Promise<Page | null> {
  const page = await compiledPage(slug, folder)
  if (!page) return null
  const { title, summary, body } = page
  return { title, summary, Content: () => createElement(body, { components }) }
}

/** All pages of a folder by title, for lists of links. */
export async function listPages(folder: PageFolder = 'pages'): Promise<PageSummary[]> {
  const pages = await Promise.all((await slugs(folder)).map(async (slug) => ({ slug, page: await compiledPage(slug, folder) })))
  return pages
    .flatMap(({ slug, page }) => (page ? [{ slug, title: page.title, summary: page.summary }] : []))
    .sort((a, b) => a.title.localeCompare(b.title, 'en'))
}

async function slugs(folder: PageFolder): Promise<string[]> {
  return (await readdir(directory(folder))).filter((name) => name.endsWith('.mdx')).map((name) => name.slice(0, -'.mdx'.length))
}

async function compiledPage(slug: string, folder: PageFolder): Promise<CompiledPage | null> {
  // The listing decides, not the path: an address can't name a file outside the directory.
  if (!(await slugs(folder)).includes(slug)) return null
  const file = path.join(directory(folder), `${slug}.mdx`)
  const changedAt = (await stat(file)).mtimeMs
  const kept = await compiled.get(file)?.catch(() => null)
  if (kept?.changedAt === changedAt) return kept
  const fresh = compile(file, changedAt)
  compiled.set(file, fresh)
  return fresh
}

async function compile(file: string, changedAt: number): Promise<CompiledPage> {
  const source = await readFile(file, 'utf8')
  const parts = /^---\n([\s\S]*?)\n---\n([\s\S]*)$/.exec(source)
  const meta = frontmatter.safeParse(parts ? parse(parts[1] ?? '') : null)
  if (!parts || !meta.success) throw new Error(`${path.basename(file)} needs frontmatter with title and summary: ${meta.error?.message ?? 'none found'}`)
  const { default: body } = await evaluate(parts[2] ?? '', { ...runtime, remarkPlugins: [remarkGfm] })
  return { changedAt, ...meta.data, body }
}
