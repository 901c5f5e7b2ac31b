// Stands in for the package of that name, which throws anywhere but in Next's server bundles.
export {}
