# Reference values for counts by hoop, dispersion, exact shares, likeness of row samples, and residue transects.
# Needs base R only. Prints JSON: Rscript stand-estimators.R > ../stand-estimators.json
json <- function(x) {
  if (is.list(x)) return(paste0('{', paste0('"', names(x), '":', vapply(x, json, ''), collapse = ','), '}'))
  # Twelve digits, so that another build of R prints the same.
  one <- if (is.character(x)) paste0('"', x, '"') else vapply(x, function(v) format(v, digits = 12, trim = TRUE), '')
  if (length(one) == 1) unname(one) else paste0('[', paste(one, collapse = ','), ']')
}

dispersion <- function(plants, lengths) {
  fit <- suppressWarnings(chisq.test(plants, p = lengths / sum(lengths)))
  x <- unname(fit$statistic); df <- unname(fit$parameter)
  list(plants = plants, lengths = lengths, index = x / df, chiSquare = x, degreesOfFreedom = df,
       pPatchy = fit$p.value, pEven = pchisq(x, df))
}

hoops <- function(plants, diameter) {
  perAcre <- plants * 43560 / (pi * diameter^2 / 4 / 144)
  fit <- t.test(perAcre)
  list(plants = plants, diameterInches = diameter, plantsPerAcre = unname(fit$estimate),
       lower = fit$conf.int[1], upper = fit$conf.int[2])
}

exact <- function(hits, trials) {
  ends <- mapply(function(x, n) binom.test(x, n)$conf.int[1:2], hits, trials)
  list(hits = hits, trials = trials, lower = ends[1, ], upper = ends[2, ])
}

wilson <- function(hits, trials) {
  ends <- mapply(function(x, n) suppressWarnings(prop.test(x, n, correct = FALSE))$conf.int[1:2], hits, trials)
  list(hits = hits, trials = trials, lower = ends[1, ], upper = ends[2, ])
}

alike <- function(figures, strips) {
  rows <- summary(aov(figures ~ factor(strips)))[[1]]
  ms <- rows[['Mean Sq']]; n <- table(strips); k <- length(n)
  n0 <- (sum(n) - sum(n^2) / sum(n)) / (k - 1)
  between <- max(0, (ms[1] - ms[2]) / n0)
  list(figures = figures, strips = strips, meanSquareStrips = ms[1], meanSquareWithin = ms[2],
       varianceStrips = between, likeness = between / (between + ms[2]))
}

residue <- function(covered, read) {
  wilson <- suppressWarnings(prop.test(sum(covered), sum(read), correct = FALSE))$conf.int
  # The linearised error of a ratio: residuals of a line through zero, weighted so that its slope is sum over sum.
  fit <- lm(covered ~ 0 + read, weights = 1 / read)
  slope <- unname(coef(fit)); off <- covered - slope * read; n <- length(read)
  se <- sqrt(var(off) / n) / mean(read)
  half <- qt(0.975, n - 1) * se
  list(covered = covered, read = read, percent = 100 * slope, wilsonLower = 100 * wilson[1],
       wilsonUpper = 100 * wilson[2], lower = 100 * (slope - half), upper = 100 * (slope + half))
}

cleared <- function(field, inRow) {
  fit <- t.test(field, inRow, paired = TRUE)
  list(field = field, inRow = inRow, points = unname(fit$estimate), lower = fit$conf.int[1], upper = fit$conf.int[2])
}

needed <- function(plants, within) {
  cv <- sd(plants) / mean(plants)
  n <- 2
  while (n < (qt(0.975, n - 1) * cv / within)^2) n <- n + 1
  list(plants = plants, within = within, cv = cv, needed = n)
}

cat(json(list(
  source = 'base R: chisq.test, t.test, binom.test, aov, prop.test, lm',
  dispersionEven = dispersion(c(31, 28, 33, 26, 30, 29), rep(17.424, 6)),
  dispersionUnequal = dispersion(c(31, 17, 37, 26, 15, 44), c(17.424, 10, 20, 17.424, 8.5, 25)),
  dispersionPatchy = dispersion(c(12, 40, 8, 35, 22, 5), rep(10, 6)),
  hoops = hoops(c(18, 22, 15, 20, 19), 30),
  exactShare = exact(c(31, 0, 34, 44), c(34, 34, 34, 100)),
  alikeUnequal = alike(c(29, 31, 30, 27, 25, 33, 34, 31, 30, 28), c(1, 1, 1, 2, 2, 3, 3, 3, 3, 4)),
  residueEqual = residue(c(44, 38, 51, 29), rep(100, 4)),
  residueUnequal = residue(c(44, 19, 51), c(100, 50, 100)),
  cleared = cleared(c(60, 55, 65), c(20, 25, 15)),
  needed = needed(c(31, 28, 33, 26, 30, 29), 0.05),
  # On time, late and missing of 34 seeds; one find of two digs.
  seedShares = wilson(c(29, 2, 3, 1), c(34, 34, 34, 2))
)), '\n')
