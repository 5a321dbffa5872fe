// Stands in for the package of the same name, which refuses to be imported outside a server bundle.
export {};
