# Reference values for weighed plants, harvested blocks, partial budgets, payback and investments.
# Needs base R only. Prints JSON: Rscript yield-and-money.R > ../yield-and-money.json
json <- function(x) {
  if (is.list(x)) return(paste0('{', paste0('"', names(x), '":', vapply(x, json, ''), collapse = ','), '}'))
  # Twelve digits, so that another build of R prints the same.
  one <- if (is.character(x)) paste0('"', x, '"') else vapply(x, function(v) format(v, digits = 12, trim = TRUE), '')
  if (length(one) == 1) unname(one) else paste0('[', paste(one, collapse = ','), ']')
}

paired <- function(late, neighbor) {
  fit <- t.test(late, neighbor, paired = TRUE)
  list(late = late, neighbor = neighbor, mean = unname(fit$estimate), standardError = unname(fit$stderr),
       degreesOfFreedom = unname(fit$parameter), lower = fit$conf.int[1], upper = fit$conf.int[2],
       share = mean(late) / mean(neighbor))
}

harvested <- function(blocks) {
  fit <- t.test(blocks)
  list(blocks = blocks, mean = unname(fit$estimate), standardError = unname(fit$stderr),
       degreesOfFreedom = unname(fit$parameter), lower = fit$conf.int[1], upper = fit$conf.int[2])
}

budget <- function(gain, se, df, price, cost) {
  ends <- gain + c(-1, 1) * qt(0.975, df) * se
  list(gain = gain, standardError = se, degreesOfFreedom = df, price = price, cost = cost,
       mean = gain * price - cost, lower = ends[1] * price - cost, upper = ends[2] * price - cost,
       breakEvenBushels = cost / price, breakEvenPrice = cost / gain,
       chanceOfGain = pt((gain - cost / price) / se, df))
}

# The payback of a cost, with the yearly return written out as dollars and its error in dollars.
payback <- function(cost, acres, price, upkeep, saving, gain, se, df, within) {
  mean <- acres * (gain * price - upkeep) + saving
  error <- acres * price * se
  ends <- mean + c(-1, 1) * qt(0.975, df) * error
  c(list(cost = cost, acres = acres, price = price, upkeep = upkeep, saving = saving, gain = gain, standardError = se,
         degreesOfFreedom = df, within = within, returnMean = mean, returnLower = ends[1], returnUpper = ends[2],
         chanceNever = pt(-mean / error, df), chanceWithin = pt((mean - cost / within) / error, df)),
    if (ends[1] > 0) list(years = cost / mean, yearsLower = cost / ends[2], yearsUpper = cost / ends[1]))
}

# Every year's payment discounted on its own and added up, without a closed formula.
worth <- function(cost, yearly, left, years, interest) {
  flows <- rep(yearly, years); flows[years] <- flows[years] + left
  list(cost = cost, yearly = yearly, left = left, years = years, interest = interest,
       value = sum(flows / (1 + interest)^(1:years)) - cost)
}

# The equal payment that pays a dollar off, found by paying it down year by year.
recovery <- function(interest, years) {
  owed <- function(payment) { debt <- 1; for (year in 1:years) debt <- debt * (1 + interest) - payment; debt }
  list(interest = interest, years = years, share = uniroot(owed, c(0, 2), tol = 1e-14)$root)
}

cat(json(list(
  paired = list(
    ears = paired(c(0.21, 0.30, 0.12, 0.00, 0.26, 0.18, 0.33), c(0.41, 0.39, 0.44, 0.36, 0.40, 0.38, 0.42)),
    two = paired(c(0.20, 0.30), c(0.40, 0.40))
  ),
  harvested = list(three = harvested(c(4, 6, 8)), five = harvested(c(-3.1, 4.2, 6.0, 9.7, 1.4))),
  budget = list(gains = budget(6.2, 2.4, 9, 4.35, 11.5), loses = budget(-2.5, 1.1, 4, 4.1, 3)),
  payback = list(
    pays = payback(6900, 620, 4.1, 0, 0, 3, 0.5, 9, 2),
    perhaps = payback(6900, 620, 4.1, 0.6, 0, 1.8, 1.2, 6, 3),
    saves = payback(6900, 620, 4.1, 0.6, 1400, 0.4, 0.15, 9, 5)
  ),
  worth = list(
    three = worth(1000, 400, 0, 3, 0.1), eight = worth(14500, 2300, 4000, 8, 0.075),
    plain = worth(6900, 1150, 500, 6, 0), losing = worth(6900, -200, 1000, 5, 0.08)
  ),
  recovery = list(eight = recovery(0.075, 8), twenty = recovery(0.04, 20), one = recovery(0.1, 1), plain = recovery(0, 8))
)), '\n')
