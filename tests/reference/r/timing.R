# Reference values for the model-free estimate of emergence with rows visited on days of their own.
# Needs R with its recommended package survival. Prints JSON: Rscript timing.R > ../timing.json
suppressPackageStartupMessages(library(survival))
number <- function(x) paste0('[', paste(vapply(x, function(v) if (is.na(v)) 'null' else format(v, digits = 10, trim = TRUE), ''), collapse = ','), ']')
case <- function(lower, upper, count, at) {
  fit <- survfit(Surv(lower, upper, type = 'interval2') ~ 1, weights = count)
  # The share up by a day at which an interval of the estimate ends.
  up <- 1 - summary(fit, times = at, extend = TRUE)$surv
  paste0('{"lower":', number(lower), ',"upper":', number(upper), ',"count":', number(count), ',"at":', number(at), ',"up":', number(up), '}')
}
cases <- c(
  case(c(4, 5, 6, 7, 8, 10), c(5, 6, 7, 8, 9, 11), c(4, 17, 10, 7, 1, 1), c(5, 6, 7, 8, 9, 11)),
  case(c(0, 5, 6, 8, 9, 12), c(5, 6, 8, 9, 12, NA), c(3, 9, 11, 4, 2, 5), c(5, 6, 8, 9, 12)),
  # Two rows with rounds of their own, some seeds of the second never seen.
  case(c(0, 5, 7, 4, 6, 8, 10), c(5, 7, 9, 6, 8, 10, NA), c(3, 10, 8, 6, 9, 4, 2), c(5, 6, 7, 8, 9, 10)),
  case(c(8, 10, 12, 9, 11, 13), c(10, 12, 14, 11, 13, 15), c(5, 15, 10, 8, 14, 6), c(10, 11, 12, 13, 14))
)
cat(paste0('[', paste(cases, collapse = ',\n'), ']\n'))
