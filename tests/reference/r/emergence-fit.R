# Reference values for smooth curves on interval-censored counts.
# Needs R with its recommended package survival. Prints JSON: Rscript emergence-fit.R > ../emergence-fit.json
suppressPackageStartupMessages(library(survival))
number <- function(x) paste0('[', paste(vapply(x, function(v) if (is.na(v)) 'null' else format(v, digits = 9, trim = TRUE), ''), collapse = ','), ']')
object <- function(x) paste0('{', paste0('"', names(x), '":', x, collapse = ','), '}')
names <- base::names
shapes <- c('log-normal' = 'lognormal', 'log-logistic' = 'loglogistic', weibull = 'weibull')
one <- function(lower, upper, count, shape) {
  # survreg reads a beginning of 0 as left-censored.
  low <- ifelse(lower == 0, NA, lower)
  fit <- survreg(Surv(low, upper, type = 'interval2') ~ 1, weights = count, dist = shapes[[shape]], control = survreg.control(rel.tolerance = 1e-12, maxiter = 200))
  v <- fit$var
  p <- c(0.1, 0.5, 0.9)
  z <- switch(shape, 'log-normal' = qnorm(p), 'log-logistic' = qlogis(p), weibull = log(-log(1 - p)))
  mu <- fit$coefficients[[1]]; s <- fit$scale
  q <- exp(mu + s * z)
  g <- rbind(q, q * s * z)
  se <- sqrt(apply(g, 2, function(d) c(d %*% v %*% d)))
  spread <- g[, 3] - g[, 1]
  object(c(shape = paste0('"', shape, '"'), mu = format(mu, digits = 9), sigma = format(s, digits = 9), seMu = format(sqrt(v[1, 1]), digits = 9),
    seLogSigma = format(sqrt(v[2, 2]), digits = 9), loglik = format(fit$loglik[1], digits = 10), quantiles = number(q), se = number(se),
    spread = format(q[3] - q[1], digits = 9), seSpread = format(sqrt(c(spread %*% v %*% spread)), digits = 9)))
}
final <- function(lower, upper, count, shape) {
  # A final share d of the seeds, by optim on the same likelihood.
  below <- switch(shape, 'log-normal' = pnorm, 'log-logistic' = plogis, weibull = function(u) 1 - exp(-exp(u)))
  up <- function(t, a) ifelse(t == 0, 0, below((log(t) - a[1]) / exp(a[2])))
  minus <- function(a) {
    d <- plogis(a[3])
    p <- ifelse(is.na(upper), 1 - d * up(lower, a), d * (up(ifelse(is.na(upper), lower + 1, upper), a) - up(lower, a)))
    -sum(count * log(pmax(p, 1e-300)))
  }
  fit <- optim(c(log(sum(count * lower) / sum(count)), log(0.2), 1), minus, method = 'BFGS', control = list(reltol = 1e-15, maxit = 1000))
  object(c(shape = paste0('"', shape, '"'), mu = format(fit$par[1], digits = 7), sigma = format(exp(fit$par[2]), digits = 7), share = format(plogis(fit$par[3]), digits = 7), loglik = format(-fit$value, digits = 10)))
}
data <- list(
  list('every plant up, daily', c(4, 5, 6, 7, 8, 10), c(5, 6, 7, 8, 9, 11), c(4, 17, 10, 7, 1, 1)),
  list('missed days, first plants left-censored', c(0, 5, 6, 8, 9), c(5, 6, 8, 9, 12), c(3, 9, 11, 4, 2)),
  list('five seeds not seen', c(0, 5, 6, 8, 9, 12), c(5, 6, 8, 9, 12, NA), c(3, 9, 11, 4, 2, 5)),
  list('slow and long', c(8, 9, 10, 11, 12, 13, 14, 16), c(9, 10, 11, 12, 13, 14, 16, 19), c(1, 3, 5, 6, 5, 4, 4, 2)),
  list('quick, three intervals', c(7, 8, 9), c(8, 9, 10), c(6, 22, 3)),
  list('a gap of three days', c(0, 4, 5, 6, 7, 10), c(4, 5, 6, 7, 10, 14), c(79, 920, 3078, 4883, 9617, 1403)),
  list('two rows on days of their own', c(8, 10, 12, 9, 11, 13), c(10, 12, 14, 11, 13, 15), c(5, 15, 10, 8, 14, 6)),
  list('half days', c(9.3, 9.8, 10.3, 10.8, 11.3), c(9.8, 10.3, 10.8, 11.3, 12.3), c(2, 9, 12, 6, 3))
)
cases <- vapply(data, function(d) {
  fits <- vapply(names(shapes), function(shape) one(d[[2]], d[[3]], d[[4]], shape), '')
  finals <- if (any(is.na(d[[3]]))) vapply(names(shapes), function(shape) final(d[[2]], d[[3]], d[[4]], shape), '') else character(0)
  object(c(title = paste0('"', d[[1]], '"'), lower = number(d[[2]]), upper = number(d[[3]]), count = number(d[[4]]), fits = paste0('[', paste(fits, collapse = ','), ']'),
    finalShare = paste0('[', paste(finals, collapse = ','), ']')))
}, '')
cat(paste0('[', paste(cases, collapse = ',\n'), ']\n'))
