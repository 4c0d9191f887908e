#include "core/document/sha256.h"

#include <array>
#include <bit>
#include <cstdint>

namespace quasistat::document
{

namespace
{

using Word = std::uint32_t;

// FIPS 180-4, 4.2.2: fractional parts of the cube roots of the first 64 primes.
constexpr std::array<Word, 64> K{
    0x428a2f98, 0x71374491, 0xb5c0fbcf, 0xe9b5dba5, 0x3956c25b, 0x59f111f1, 0x923f82a4, 0xab1c5ed5,
    0xd807aa98, 0x12835b01, 0x243185be, 0x550c7dc3, 0x72be5d74, 0x80deb1fe, 0x9bdc06a7, 0xc19bf174,
    0xe49b69c1, 0xefbe4786, 0x0fc19dc6, 0x240ca1cc, 0x2de92c6f, 0x4a7484aa, 0x5cb0a9dc, 0x76f988da,
    0x983e5152, 0xa831c66d, 0xb00327c8, 0xbf597fc7, 0xc6e00bf3, 0xd5a79147, 0x06ca6351, 0x14292967,
    0x27b70a85, 0x2e1b2138, 0x4d2c6dfc, 0x53380d13, 0x650a7354, 0x766a0abb, 0x81c2c92e, 0x92722c85,
    0xa2bfe8a1, 0xa81a664b, 0xc24b8b70, 0xc76c51a3, 0xd192e819, 0xd6990624, 0xf40e3585, 0x106aa070,
    0x19a4c116, 0x1e376c08, 0x2748774c, 0x34b0bcb5, 0x391c0cb3, 0x4ed8aa4a, 0x5b9cca4f, 0x682e6ff3,
    0x748f82ee, 0x78a5636f, 0x84c87814, 0x8cc70208, 0x90befffa, 0xa4506ceb, 0xbef9a3f7, 0xc67178f2};

// FIPS 180-4, 5.3.3.
constexpr std::array<Word, 8> initialHash{0x6a09e667, 0xbb67ae85, 0x3c6ef372, 0xa54ff53a,
                                          0x510e527f, 0x9b05688c, 0x1f83d9ab, 0x5be0cd19};

constexpr std::size_t blockBytes = 64;

/// Padding to whole blocks: a one bit, zeros, the length in bits (5.1.1).
std::string padded(std::string_view bytes)
{
    std::string text(bytes);
    text += '\x80';
    while (text.size() % blockBytes != blockBytes - 8) text += '\0';
    const std::uint64_t bits = static_cast<std::uint64_t>(bytes.size()) * 8;
    for (int shift = 56; shift >= 0; shift -= 8) text += static_cast<char>((bits >> shift) & 0xFF);
    return text;
}

/// Message schedule W of one block (6.2.2, step 1).
std::array<Word, 64> schedule(std::string_view block)
{
    std::array<Word, 64> W{};
    for (std::size_t t = 0; t < 16; ++t)
        for (std::size_t byte = 0; byte < 4; ++byte)
            W[t] = (W[t] << 8) | static_cast<unsigned char>(block[4 * t + byte]);
    for (std::size_t t = 16; t < 64; ++t) {
        const Word sigma0 = std::rotr(W[t - 15], 7) ^ std::rotr(W[t - 15], 18) ^ (W[t - 15] >> 3);
        const Word sigma1 = std::rotr(W[t - 2], 17) ^ std::rotr(W[t - 2], 19) ^ (W[t - 2] >> 10);
        W[t] = sigma1 + W[t - 7] + sigma0 + W[t - 16];
    }
    return W;
}

void compress(std::array<Word, 8> &hash, std::string_view block)
{
    const std::array<Word, 64> W = schedule(block);
    auto [a, b, c, d, e, f, g, h] = hash;
    for (std::size_t t = 0; t < 64; ++t) {
        const Word T1 =
            h + (std::rotr(e, 6) ^ std::rotr(e, 11) ^ std::rotr(e, 25)) + ((e & f) ^ (~e & g)) + K[t] + W[t];
        const Word T2 = (std::rotr(a, 2) ^ std::rotr(a, 13) ^ std::rotr(a, 22)) + ((a & b) ^ (a & c) ^ (b & c));
        h = g;
        g = f;
        f = e;
        e = d + T1;
        d = c;
        c = b;
        b = a;
        a = T1 + T2;
    }
    const std::array<Word, 8> working{a, b, c, d, e, f, g, h};
    for (std::size_t i = 0; i < hash.size(); ++i) hash[i] += working[i];
}

} // namespace

std::string sha256(std::string_view bytes)
{
    const std::string text = padded(bytes);
    std::array<Word, 8> hash = initialHash;
    for (std::size_t start = 0; start < text.size(); start += blockBytes)
        compress(hash, std::string_view(text).substr(start, blockBytes));

    constexpr std::string_view digits = "0123456789abcdef";
    std::string digest;
    for (const Word word : hash)
        for (int shift = 28; shift >= 0; shift -= 4) digest += digits[(word >> shift) & 0xF];
    return digest;
}

} // namespace quasistat::document
