# The same descriptive figures in R, vectorised over columns. Reads packed doubles, then times one pass for each line
# that arrives, so that the caller can take turns with its own passes; the figures of the last pass are written out.
args <- commandArgs(trailingOnly = TRUE)
input <- args[1]; output <- args[2]; rows <- as.integer(args[3]); plants <- as.integer(args[4]); visits <- as.integer(args[5])
doubles <- file(input, "rb")
P <- matrix(readBin(doubles, "double", rows * plants), nrow = plants)
days <- readBin(doubles, "double", visits)
C <- matrix(readBin(doubles, "double", rows * visits), nrow = visits)
held <- readBin(doubles, "double", rows)
area <- readBin(doubles, "double", rows)
theoretical <- readBin(doubles, "double", rows)
close(doubles)

pass <- function() {
  k <- plants - 1
  D <- P[-1, ] - P[-plants, ]
  mean <- (P[plants, ] - P[1, ]) / k
  sd <- sqrt((colSums(D * D) - k * mean * mean) / (k - 1))
  multiples <- colSums(D < rep((0.5 + 5e-10) * theoretical, each = k)) / k
  notMisses <- colSums(D < rep((1.5 + 5e-10) * theoretical, each = k)) / k
  N <- C[visits, ]
  dayOf <- function(share) {
    target <- share * N
    reached <- colSums(C < rep(target - 1e-9 * pmax(1, N), each = visits)) + 1
    at <- cbind(reached, seq_len(rows))
    before <- cbind(pmax(reached - 1, 1), seq_len(rows))
    up <- C[at]; upBefore <- C[before]
    part <- ifelse(reached == 1 | abs(up - target) <= 1e-9 * pmax(1, N), 1, (target - upBefore) / (up - upBefore))
    dayBefore <- days[before[, 1]]
    dayBefore + part * (days[reached] - dayBefore)
  }
  t10 <- dayOf(0.1); t50 <- dayOf(0.5); t90 <- dayOf(0.9)
  list(held / area, mean, sd, sd / mean, multiples, notMisses - multiples, 1 - notMisses, t10, t50, t90, t90 - t10)
}

input <- file("stdin", "r")
figures <- NULL
repeat {
  line <- readLines(input, n = 1)
  if (length(line) == 0 || line == "end") break
  gc()
  started <- Sys.time()
  figures <- pass()
  cat(as.numeric(difftime(Sys.time(), started, units = "secs")) * 1000, "\n")
  flush(stdout())
}
out <- file(output, "wb")
for (figure in figures) writeBin(as.double(figure), out)
close(out)
