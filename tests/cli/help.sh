# Help of the program and of each command, on standard output.
bluecone --help
for command in $(bluecone list commands --bare); do
    echo
    bluecone "$command" --help
done
