# Solves the problems of a file with R: Rscript solve_r.R (nnls|quadprog) PROBLEMS [FIRST-N].
# nnls takes the bounded ones, quadprog those whose fractions sum to one.
arguments <- commandArgs(trailingOnly = TRUE)
tool <- arguments[1]
limit <- if (length(arguments) > 2) as.integer(arguments[3]) else .Machine$integer.max
suppressPackageStartupMessages(library(tool, character.only = TRUE))
cat(sprintf("# R package %s %s\n", tool, packageVersion(tool)))
done <- 0
for (line in readLines(arguments[2])) {
  if (startsWith(line, "#")) next
  parts <- strsplit(line, ",", fixed = TRUE)[[1]]
  if (parts[2] != (if (tool == "nnls") "bounded" else "simplex") || done >= limit) next
  done <- done + 1
  n <- as.integer(parts[3])
  m <- as.integer(parts[4])
  values <- as.numeric(parts[-(1:4)])
  a <- matrix(values[1:(n * m)], nrow = m)
  b <- values[(n * m + 1):(n * m + m)]
  if (tool == "nnls") {
    x <- nnls(a, b)$x
  } else {
    x <- solve.QP(crossprod(a), crossprod(a, b), cbind(rep(1, n), diag(n)), c(1, rep(0, n)), meq = 1)$solution
  }
  cat(parts[1], sprintf("%.17g", x), sep = ",")
  cat("\n")
}
