# Reference values for smooth curves on interval-censored counts.
# Needs R with its recommended package survival. Prints JSON: Rscript emergence-fit.R > ../emergence-fit.json
suppressPackageStartupMessages(library(survival))
number <- function(x) paste0('[', paste(vapply(x, function(v) if (is.na(v)) 'null' else format(v, digits = 9, trim = TRUE), ''), collapse = ','), ']')
object <- function(x) paste0('{', paste0('"', names(x), '":', x, collapse = ','), '}')
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
# The same likelihood by logarithms of tails and optim, where survreg does not serve: a final share d, counts conditional on
# the last visit, and plants far in a tail (survreg holds their share up from below and stops at no maximum).
between <- list(
  'log-normal' = function(l, h) {
    turned <- l > 0
    low <- ifelse(turned, -h, l); high <- ifelse(turned, -l, h)
    top <- pnorm(high, log.p = TRUE)
    top + log(-expm1(pnorm(low, log.p = TRUE) - top))
  },
  'log-logistic' = function(l, h) plogis(h, log.p = TRUE) + plogis(l, lower.tail = FALSE, log.p = TRUE) + log(-expm1(l - h)),
  weibull = function(l, h) {
    hazard <- h + log(-expm1(l - h))
    -exp(l) + ifelse(hazard < -36, hazard, log(-expm1(-exp(hazard))))
  }
)
by_optim <- function(lower, upper, count, shape, share = FALSE, last = NULL) {
  seen <- !is.na(upper)
  minus <- function(a) {
    at <- function(t) (log(t) - a[1]) / exp(a[2])
    d <- if (share) plogis(a[3]) else 1
    came <- log(d) + between[[shape]](at(lower[seen]), at(upper[seen]))
    if (!is.null(last)) came <- came - between[[shape]](-Inf, at(last))
    none <- log((1 - d) + d * exp(between[[shape]](at(lower[!seen]), Inf)))
    r <- -sum(count[seen] * came) - sum(count[!seen] * none)
    if (is.finite(r)) r else 1e12
  }
  middle <- log((lower[seen] + upper[seen]) / 2)
  mu <- sum(middle * count[seen]) / sum(count[seen])
  best <- NULL
  for (s in c(0.03, 0.1, 0.3)) {
    fit <- optim(c(mu, log(s), if (share) 1), minus, control = list(reltol = 1e-15, maxit = 20000))
    fit <- optim(fit$par, minus, control = list(reltol = 1e-15, maxit = 20000))
    if (is.null(best) || fit$value < best$value) best <- fit
  }
  # Newton's steps, with optim's own differences, until the slope is flat.
  steps <- 1e-4 * c(exp(best$par[2]), 1, if (share) 1)
  a <- best$par
  for (i in 1:20) {
    h <- optimHess(a, minus, control = list(ndeps = steps))
    g <- vapply(seq_along(a), function(j) { e <- replace(0 * a, j, steps[j]); (minus(a + e) - minus(a - e)) / (2 * steps[j]) }, 0)
    a <- a - c(solve(h, g))
  }
  v <- solve(optimHess(a, minus, control = list(ndeps = steps)))
  p <- c(0.1, 0.5, 0.9)
  z <- switch(shape, 'log-normal' = qnorm(p), 'log-logistic' = qlogis(p), weibull = log(-log(1 - p)))
  q <- exp(a[1] + exp(a[2]) * z)
  g <- rbind(q, q * exp(a[2]) * z, if (share) 0)
  se <- sqrt(apply(g, 2, function(d) c(d %*% v %*% d)))
  spread <- g[, 3] - g[, 1]
  object(c(shape = paste0('"', shape, '"'), mu = format(a[1], digits = 9), sigma = format(exp(a[2]), digits = 9), seMu = format(sqrt(v[1, 1]), digits = 9),
    seLogSigma = format(sqrt(v[2, 2]), digits = 9), loglik = format(-minus(a), digits = 10), quantiles = number(q), se = number(se),
    spread = format(q[3] - q[1], digits = 9), seSpread = format(sqrt(c(spread %*% v %*% spread)), digits = 9),
    if (share) c(share = format(plogis(a[3]), digits = 9), seShare = format(plogis(a[3]) * plogis(-a[3]) * sqrt(v[3, 3]), digits = 9))))
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
# Counts are invented. Each: title, after, by, plants; `last` is the last visit where the fit is conditional on it.
by_logs <- list(
  list('a plant far behind', c(5, 6, 39), c(6, 7, 40), c(3000, 3000, 1)),
  list('a plant far ahead', c(1, 10, 11, 12), c(2, 11, 12, 13), c(1, 3000, 4000, 2000))
)
by_last_visit <- list(
  list('counting not ended', c(0, 5, 6, 7, 8), c(5, 6, 7, 8, 9), c(44, 181, 271, 256, 150), last = 9),
  list('counting not ended, missed days, last visit without new plants', c(5, 7, 8, 10), c(7, 8, 10, 11), c(60, 80, 70, 9), last = 12)
)
final_shares <- list(
  list('five seeds not seen', c(0, 5, 6, 8, 9, 12), c(5, 6, 8, 9, 12, NA), c(3, 9, 11, 4, 2, 5)),
  list('a third of the seeds not seen', c(6, 7, 8, 9, 11, 14), c(7, 8, 9, 11, 14, NA), c(12, 31, 22, 10, 2, 38))
)
each_shape <- function(d, ...) {
  fits <- vapply(names(shapes), function(shape) by_optim(d[[2]], d[[3]], d[[4]], shape, last = d$last, ...), '')
  object(c(title = paste0('"', d[[1]], '"'), lower = number(d[[2]]), upper = number(d[[3]]), count = number(d[[4]]), if (!is.null(d$last)) c(last = d$last), fits = paste0('[', paste(fits, collapse = ','), ']')))
}
group <- function(all, ...) paste0('[', paste(vapply(all, each_shape, '', ...), collapse = ',\n'), ']')
survreg_cases <- vapply(data, function(d) {
  fits <- vapply(names(shapes), function(shape) one(d[[2]], d[[3]], d[[4]], shape), '')
  object(c(title = paste0('"', d[[1]], '"'), lower = number(d[[2]]), upper = number(d[[3]]), count = number(d[[4]]), fits = paste0('[', paste(fits, collapse = ','), ']')))
}, '')
cat('{"made_with":"R 4.2.2; survival 3.5-3 (survreg, type interval2) and optim on the same likelihood; counts of the first case are a germination example vector, the others invented or simulated",\n"survreg":[',
  paste(survreg_cases, collapse = ',\n'), '],\n"byLogs":', group(by_logs), ',\n"byLastVisit":', group(by_last_visit), ',\n"finalShare":', group(final_shares, share = TRUE), '}\n', sep = '')
