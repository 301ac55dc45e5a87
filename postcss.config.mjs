// Tailwind 4 is configured in app/globals.css; this file only plugs it in.
export default { plugins: { '@tailwindcss/postcss': {} } }
