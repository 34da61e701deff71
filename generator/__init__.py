"""From the spec to the site: one module for each stage. Knows no gas facts."""
