// Tailwind 4 is configured in app/globals.css; this file only plugs it in.
const config = { plugins: { '@tailwindcss/postcss': {} } }

export default config
