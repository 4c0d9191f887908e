#include "core/document/sha256.h"

#include <gtest/gtest.h>

using quasistat::document::sha256;

// NIST, Secure Hash Standard examples (csrc.nist.gov, "SHA256.pdf") and FIPS 180-2 appendix B.3 (one million "a").
TEST(Sha256, AgreesWithThePublishedExamples)
{
    EXPECT_EQ(sha256("abc"), "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad");
    EXPECT_EQ(sha256("abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq"),
              "248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1");
    EXPECT_EQ(sha256(std::string(1000000, 'a')), "cdc76e5c9914fb9281a1c7e284d73e67f1809a48a497200e046d39ccc7112cd0");
}

// NIST CAVP, SHA256ShortMsg.rsp, Len = 0.
TEST(Sha256, OfNothingIsThePublishedDigest)
{
    EXPECT_EQ(sha256(""), "e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855");
}
