// Stands in for the server-only package outside the framework's bundler.
export {}
