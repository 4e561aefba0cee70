#include "cli/input/sha256.hpp"

#include <fmt/format.h>
#include <openssl/evp.h>

#include <array>
#include <stdexcept>

namespace ringward::cli {

std::string sha256_bytes(const std::string& bytes) {
  std::array<unsigned char, EVP_MAX_MD_SIZE> digest{};
  unsigned int size = 0;
  if (EVP_Digest(bytes.data(), bytes.size(), digest.data(), &size, EVP_sha256(), nullptr) != 1) {
    throw std::runtime_error("the SHA-256 of the crypto library is not available");
  }
  return {digest.begin(), digest.begin() + size};
}

std::string sha256_hex(const std::string& bytes) {
  std::string hex;
  for (const char byte : sha256_bytes(bytes)) {
    hex += fmt::format("{:02x}", static_cast<unsigned char>(byte));
  }
  return hex;
}

}  // namespace ringward::cli
