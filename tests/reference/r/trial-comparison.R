# Reference values for pooled environments, row units, residue against timing, and power.
# Needs R with its recommended packages (MASS, lattice). Prints JSON: Rscript trial-comparison.R > ../trial-comparison.json
suppressPackageStartupMessages({ library(MASS); library(lattice) })
options(contrasts = c('contr.treatment', 'contr.poly'))

json <- function(x) {
  if (is.null(x)) return('null')
  if (is.list(x)) {
    inner <- vapply(x, json, '')
    if (is.null(names(x))) return(paste0('[', paste(inner, collapse = ','), ']'))
    return(paste0('{', paste0('"', names(x), '":', inner, collapse = ','), '}'))
  }
  one <- if (is.character(x)) paste0('"', x, '"') else if (is.logical(x)) tolower(as.character(x)) else
    # Twelve digits, so that another build of R prints the same.
    format(x, digits = 12, trim = TRUE, scientific = NA)
  one <- if (is.numeric(x)) vapply(x, function(v) format(v, digits = 12, trim = TRUE), '') else one
  if (length(one) == 1 && is.null(attr(x, 'many'))) unname(one) else paste0('[', paste(one, collapse = ','), ']')
}
many <- function(x) { attr(x, 'many') <- TRUE; x }
columns <- function(d) lapply(as.list(d), function(v) many(if (is.factor(v)) as.character(v) else v))

# One difference of two settings in y = block + setting + error.
difference <- function(d, first, second) {
  d$block <- factor(d$block)
  d$setting <- relevel(factor(d$setting), ref = second)
  fit <- lm(y ~ block + setting, d)
  row <- summary(fit)$coefficients[paste0('setting', first), ]
  half <- qt(0.975, fit$df.residual) * row[[2]]
  list(difference = row[[1]], se = row[[2]], df = fit$df.residual, mse = summary(fit)$sigma^2,
       lower = row[[1]] - half, upper = row[[1]] + half)
}

environments <- function(d, first, second) {
  d$site <- factor(paste(d$environment, d$block))
  d$environment <- factor(d$environment); d$setting <- factor(d$setting)
  with <- anova(lm(y ~ environment + site + setting + setting:environment, d))
  without <- anova(lm(y ~ environment + site + setting, d))
  ms <- with$`Mean Sq`; df <- with$Df; rows <- rownames(with)
  at <- function(name) which(rows == name)
  inter <- at('environment:setting'); set <- at('setting'); res <- at('Residuals')
  each <- lapply(split(d, d$environment), function(e) difference(e, first, second))
  diffs <- vapply(each, function(e) e$difference, 0)
  ses <- vapply(each, function(e) e$se, 0); dfs <- vapply(each, function(e) e$df, 0)
  t <- t.test(diffs)
  v <- ses^2; m <- length(v)
  se <- sqrt(sum(v)) / m; wdf <- sum(v)^2 / sum(v^2 / dfs)
  d$block <- d$site
  list(input = columns(d[c('y', 'setting', 'environment')]), block = many(as.character(d$site)),
    first = first, second = second,
    expected = list(
      interaction = list(ss = with$`Sum Sq`[inter], df = df[inter], F = with$`F value`[inter], p = with$`Pr(>F)`[inter]),
      error = list(ms = ms[res], df = df[res]),
      settings_against_error = list(F = with$`F value`[set], p = with$`Pr(>F)`[set]),
      settings_against_interaction = list(F = ms[set] / ms[inter], p = pf(ms[set] / ms[inter], df[set], df[inter], lower.tail = FALSE)),
      without = list(ms = without$`Mean Sq`[4], df = without$Df[4], F = without$`F value`[3], p = without$`Pr(>F)`[3]),
      without_difference = difference(d, first, second),
      environments = names(each) |> as.character() |> many(),
      each = unname(each),
      others = list(mean = mean(diffs), se = t$stderr, df = unname(t$parameter), p = t$p.value, lower = t$conf.int[1], upper = t$conf.int[2]),
      these = list(se = se, df = wdf, p = 2 * pt(-abs(mean(diffs) / se), wdf),
        lower = mean(diffs) - qt(0.975, wdf) * se, upper = mean(diffs) + qt(0.975, wdf) * se)))
}

two_years <- rbind(
  data.frame(y = immer$Y1, setting = as.character(immer$Var), block = as.character(immer$Loc), environment = '1931'),
  data.frame(y = immer$Y2, setting = as.character(immer$Var), block = as.character(immer$Loc), environment = '1932'))
six_sites <- data.frame(y = barley$yield, setting = as.character(barley$variety),
  block = as.character(barley$year), environment = as.character(barley$site))
thinned <- two_years[-c(7, 23, 41), ]

# Each row unit less the mean of the others, strips taken out.
row_units <- function(d) {
  d$strip <- factor(d$strip); d$unit <- factor(d$unit)
  fit <- lm(y ~ strip + unit, d)
  units <- levels(d$unit); u <- length(units)
  at <- paste0('unit', units[-1]); b <- c(0, coef(fit)[at]); V <- matrix(0, u, u)
  V[-1, -1] <- vcov(fit)[at, at]
  rows <- lapply(seq_len(u), function(i) {
    w <- rep(-1 / (u - 1), u); w[i] <- 1
    est <- sum(w * b); se <- sqrt(c(t(w) %*% V %*% w))
    list(est = est, se = se, p = 2 * pt(-abs(est / se), fit$df.residual))
  })
  ps <- vapply(rows, function(r) r$p, 0)
  f <- anova(fit)
  list(input = columns(d[c('y', 'strip', 'unit')]),
    expected = list(units = many(units), less_others = many(vapply(rows, function(r) r$est, 0)),
      se = many(vapply(rows, function(r) r$se, 0)), p = many(ps), p_holm = many(p.adjust(ps, 'holm')),
      df = fit$df.residual, F = f$`F value`[2], F_p = f$`Pr(>F)`[2]))
}
units <- data.frame(y = immer$Y1, strip = as.character(immer$Loc), unit = as.character(as.integer(immer$Var)))

slope <- function(d) {
  d$block <- factor(d$block)
  fit <- lm(y ~ block + x, d); row <- summary(fit)$coefficients['x', ]; ci <- confint(fit)['x', ]
  list(input = columns(d[c('y', 'x', 'block')]),
    expected = list(slope = row[[1]], se = row[[2]], p = row[[4]], lower = ci[[1]], upper = ci[[2]], df = fit$df.residual))
}
# Trees stand for blocks, age for cover (per 20 days, so that it lies between 0 and 100), circumference for days.
trees <- data.frame(y = Orange$circumference, x = Orange$age / 20, block = as.character(Orange$Tree))

grid <- expand.grid(f = c(0.5, 3, 6, 15), d1 = c(1, 2, 5, 23), d2 = c(3, 8, 60), ncp = c(0, 0.5, 4, 12, 60))
tails <- mapply(function(f, d1, d2, ncp) if (ncp == 0) pf(f, d1, d2, lower.tail = FALSE) else pf(f, d1, d2, ncp, lower.tail = FALSE),
  grid$f, grid$d1, grid$d2, grid$ncp)

# Paired t with strips of standard deviation 0.35: differences have sqrt(2) times that.
paired <- lapply(3:8, function(b) list(blocks = b,
  power_of_1 = power.t.test(n = b, delta = 1, sd = sqrt(2) * 0.35, type = 'paired', strict = TRUE)$power,
  delta_at_80 = power.t.test(n = b, power = 0.8, sd = sqrt(2) * 0.35, type = 'paired', strict = TRUE, tol = 1e-12)$delta))
needed <- lapply(c(0.4, 0.6, 0.8, 1.2), function(delta) list(delta = delta,
  n = power.t.test(delta = delta, power = 0.8, sd = sqrt(2) * 0.35, type = 'paired', strict = TRUE, tol = 1e-12)$n))
f_power <- function(s, b, delta, sd) { d2 <- (s - 1) * (b - 1)
  pf(qf(0.05, s - 1, d2, lower.tail = FALSE), s - 1, d2, ncp = b * delta^2 / (2 * sd^2), lower.tail = FALSE) }
holm_power <- function(s, b, delta, sd) { d2 <- (s - 1) * (b - 1); crit <- qt(0.025 / (s - 1), d2, lower.tail = FALSE)
  pf(crit^2, 1, d2, ncp = b * delta^2 / (2 * sd^2), lower.tail = FALSE) }
# q(.95; settings, df) from ../studentized-range-quantiles.csv, because qtukey is off at few degrees of freedom.
q <- read.csv(file.path(dirname(sub('--file=', '', grep('--file=', commandArgs(), value = TRUE)[1])), '..', 'studentized-range-quantiles.csv'))
designs <- list(c(3, 4), c(3, 5), c(4, 5), c(4, 6), c(5, 6))
blocks <- lapply(designs, function(sb) { s <- sb[1]; b <- sb[2]; d2 <- (s - 1) * (b - 1)
  crit <- q$q[q$p == 0.95 & q$k == s & q$df == d2] / sqrt(2)
  tukey <- function(delta) pf(crit^2, 1, d2, ncp = b * delta^2 / (2 * 0.35^2), lower.tail = FALSE)
  solve_for <- function(power) uniroot(function(delta) power(delta) - 0.8, c(0.01, 5), tol = 1e-12)$root
  list(settings = s, blocks = b,
    power_of_1 = list(any = f_power(s, b, 1, 0.35), holm = holm_power(s, b, 1, 0.35), tukey = tukey(1)),
    delta_at_80 = list(any = solve_for(function(x) f_power(s, b, x, 0.35)),
      holm = solve_for(function(x) holm_power(s, b, x, 0.35)), tukey = solve_for(tukey))) })

# Error standard deviations of the two years, pooled, with the chi-square interval.
sds <- lapply(split(two_years, two_years$environment), function(e) difference(e, 'T', 'M'))
ss <- sum(vapply(sds, function(e) e$mse * e$df, 0)); df <- sum(vapply(sds, function(e) e$df, 0))

out <- list(
  made_with = 'R 4.2, MASS::immer, lattice::barley, datasets::Orange; strip SD 0.35 in the power cases',
  environments = list(immer = environments(two_years, 'T', 'M'), barley = environments(six_sites, 'Trebi', 'Manchuria'),
    immer_lost = environments(thinned, 'T', 'M')),
  row_units = list(complete = row_units(units), lost = row_units(units[-c(4, 17), ])),
  residue = list(trees = slope(trees), lost = slope(trees[-c(1, 9, 10, 11, 12, 13, 14, 30), ])),
  noncentral_f = list(f = many(grid$f), d1 = many(grid$d1), d2 = many(grid$d2), ncp = many(grid$ncp), p = many(tails)),
  paired = paired, needed = needed, blocks = blocks,
  strip_sd = list(sd = sqrt(ss / df), df = df, lower = sqrt(ss / qchisq(0.975, df)), upper = sqrt(ss / qchisq(0.025, df))))
cat(gsub('],"', '],\n"', gsub('},\\{', '},\n{', json(out))), '\n', sep = '')
